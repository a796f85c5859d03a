import { describeOutline, type RunInput } from '@hidewright/domain';
import type { LayoutSource, Offer } from '@hidewright/contract';
import { dayIn } from '../../day-in.ts';
import { notFound, Problem } from '../../http/problem.ts';
import type { Work } from '../../work.ts';
import { Customer } from '../customers/customer.entity.ts';
import { StoredLayout } from '../layouts/layout.entity.ts';
import { pathOf } from '../layouts/stored-layouts.ts';
import { Quote } from '../quotes/quote.entity.ts';
import { quotedOf } from '../quotes/quoted.ts';
import { Workshop } from '../workshop/workshop.entity.ts';
import { quoteBehind } from './customer-links.ts';

/** The same words for a token that never was, has expired or was stopped. */
const noOffer = () =>
  new Problem(
    404,
    'Not found',
    'This link does not work, or no longer works. Ask the shop for a new one.',
  );

/** @throws {Problem} 404 when the token opens nothing */
export async function quoteIdBehind(work: Work, token: string): Promise<number> {
  const quoteId = await quoteBehind(work, token);
  if (quoteId === undefined) throw noOffer();
  return quoteId;
}

/** What the customer sees of a quote. @throws {Problem} 404 */
export async function offerOf(work: Work, quoteId: number): Promise<Offer> {
  const quote = await work.em.findOne(Quote, quoteId);
  if (quote === null) throw notFound('quote');
  const workshop = await work.em.findOneOrFail(Workshop, 1);
  const customer = await work.em.findOneOrFail(Customer, quote.customerId);
  const { breaks, options, tooling, toolingTotal } = quotedOf(quote);
  return {
    shopName: workshop.name,
    number: quote.number,
    state: stateOf(quote, work.today),
    customerName: customer.name,
    title: quote.title,
    inHandsOn: quote.inHandsOn,
    validUntil: quote.validUntil,
    message: quote.message,
    outline: outlineOf(await work.em.findOneOrFail(StoredLayout, quote.layoutId)),
    currency: workshop.currency,
    breaks: breaks.map(({ typedPrice: _typedPrice, ...rung }) => rung),
    options,
    tooling,
    toolingTotal,
    resalePrice: (quote.input as RunInput).resalePrice ?? null,
    agreedQuantity: quote.agreedQuantity,
    agreedOption: quote.agreedOption,
    agreedOn: quote.agreedAt === null ? null : dayIn(workshop.timeZone, new Date(quote.agreedAt)),
    order: await orderOf(work, quoteId, workshop.timeZone),
  };
}

interface OrderRow {
  number: string;
  promised_on: string;
  shipped_on: string | null;
  cancelled_at: string | null;
}

async function orderOf({ em }: Work, quoteId: number, zone: string): Promise<Offer['order']> {
  const [row] = await em.execute<OrderRow[]>(
    `SELECT o.number, o.promised_on, o.shipped_on, c.at AS cancelled_at FROM customer_order o
       LEFT JOIN order_cancellation c ON c.order_id = o.id WHERE o.quote_id = ?`,
    [quoteId],
  );
  if (row === undefined) return null;
  return {
    number: row.number,
    promisedOn: row.promised_on,
    shippedOn: row.shipped_on,
    cancelledOn: row.cancelled_at === null ? null : dayIn(zone, new Date(row.cancelled_at)),
  };
}

/** A draft or superseded quote has no link that works. */
function stateOf(quote: Quote, today: string): Offer['state'] {
  if (quote.state === 'agreed' || quote.state === 'declined') return quote.state;
  if (quote.state !== 'sent') return 'lapsed';
  return quote.validUntil !== null && quote.validUntil < today ? 'lapsed' : 'open';
}

function outlineOf(stored: StoredLayout): Offer['outline'] {
  const path = pathOf(stored);
  const source = stored.input as LayoutSource;
  if (path === null || source.by !== 'outline') return null;
  return { path, words: describeOutline(source.input.outline) };
}
