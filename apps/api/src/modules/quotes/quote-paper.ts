import type { RunInput } from '@hidewright/domain';
import type { QuotePaper } from '../../papers/quote-pdf.ts';
import { dayIn } from '../../day-in.ts';
import type { Work } from '../../work.ts';
import { Customer } from '../customers/customer.entity.ts';
import { StoredLayout } from '../layouts/layout.entity.ts';
import { pathOf } from '../layouts/stored-layouts.ts';
import { Workshop } from '../workshop/workshop.entity.ts';
import type { Quote } from './quote.entity.ts';
import { quotedOf } from './quoted.ts';

/** What goes on paper for a quote as it is now. */
export async function paperOf(work: Work, quote: Quote): Promise<QuotePaper> {
  const workshop = await work.em.findOneOrFail(Workshop, 1);
  const customer = await work.em.findOneOrFail(Customer, quote.customerId);
  const { breaks, options, tooling, toolingTotal } = quotedOf(quote);
  return {
    number: quote.revision === 1 ? quote.number : `${quote.number}, revision ${quote.revision}`,
    shopName: workshop.name,
    shopAddress: workshop.address,
    customerName: customer.name,
    title: quote.title,
    day: quote.sentAt === null ? work.today : dayIn(workshop.timeZone, new Date(quote.sentAt)),
    inHandsOn: quote.inHandsOn,
    validUntil:
      quote.validUntil ?? lastGoodDay(work.today, workshop.quoteValidDays, quote.inHandsOn),
    message: quote.message,
    currency: workshop.currency,
    outlinePath: pathOf(await work.em.findOneOrFail(StoredLayout, quote.layoutId)),
    breaks,
    options,
    resalePrice: (quote.input as RunInput).resalePrice ?? null,
    tooling,
    toolingTotal,
  };
}

/** An offer runs out after the shop's usual time, or on the day the goods are needed where that comes first. */
function lastGoodDay(today: string, validDays: number, inHandsOn: string | null): string {
  const usual = new Date(Date.parse(`${today}T00:00:00Z`) + validDays * 24 * 60 * 60_000)
    .toISOString()
    .slice(0, 10);
  return inHandsOn !== null && inHandsOn < usual ? inHandsOn : usual;
}
