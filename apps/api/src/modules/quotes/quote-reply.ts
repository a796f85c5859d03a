import { quoteTerms, type Quote as QuoteReply } from '@hidewright/contract';
import type { Layout, RunInput } from '@hidewright/domain';
import type { Work } from '../../work.ts';
import { Customer } from '../customers/customer.entity.ts';
import { StoredLayout } from '../layouts/layout.entity.ts';
import { pathOf } from '../layouts/stored-layouts.ts';
import { openLink } from '../links/customer-links.ts';
import { latestMail } from '../mail/outbox.ts';
import { Order } from '../orders/order.entity.ts';
import { Pattern } from '../patterns/pattern.entity.ts';
import { PatternVersion } from '../patterns/pattern-version.entity.ts';
import { whyNoMail } from './why-no-mail.ts';
import { Quote } from './quote.entity.ts';
import { numbersOfQuote } from './quote-numbers.ts';
import { quotedOf } from './quoted.ts';

/**
 * A quote with all that its screen shows.
 * @param mailAvailable whether a mail server is set
 */
export async function quoteReply(
  work: Work,
  quote: Quote,
  mailAvailable: boolean,
): Promise<QuoteReply> {
  const customer = await work.em.findOneOrFail(Customer, quote.customerId);
  const version = await work.em.findOneOrFail(PatternVersion, quote.patternVersionId);
  const pattern = await work.em.findOneOrFail(Pattern, version.patternId);
  // Read only: beside the entities that are, it would be compared with what it was at every flush.
  const stored = await work.em.findOneOrFail(StoredLayout, quote.layoutId, {
    disableIdentityMap: true,
  });
  const order = await work.em.findOne(Order, { quoteId: quote.id });
  const { breaks } = quotedOf(quote);
  const input = quote.input as RunInput;
  return {
    ...ownFields(quote),
    customerName: customer.name,
    patternId: pattern.id,
    patternName: pattern.name,
    patternVersion: version.number,
    orderId: order?.id ?? null,
    orderNumber: order?.number ?? null,
    layout: stored.result as Layout,
    outlinePath: pathOf(stored),
    breaks,
    tooling: input.tooling,
    input,
    numbers: numbersOfQuote(quote),
    customerEmail: customer.email,
    cannotMail: whyNoMail(customer, mailAvailable),
    letter: await letterOf(work, quote.id),
    link: await linkOf(work, quote.id),
    revisions: await otherRevisions(work, quote),
  };
}

function ownFields(quote: Quote) {
  return {
    id: quote.id,
    number: quote.number,
    revision: quote.revision,
    state: quote.state,
    customerId: quote.customerId,
    layoutId: quote.layoutId,
    title: quote.title,
    inHandsOn: quote.inHandsOn,
    validUntil: quote.validUntil,
    createdAt: quote.createdAt,
    sentAt: quote.sentAt,
    agreedAt: quote.agreedAt,
    agreedQuantity: quote.agreedQuantity,
    agreedHow: quote.agreedHow as QuoteReply['agreedHow'],
    agreedOption: quote.agreedOption,
    terms: quoteTerms.parse(quote.terms),
    overrides: quote.overrides,
    message: quote.message,
    version: quote.version,
  };
}

async function letterOf(work: Work, quoteId: number): Promise<QuoteReply['letter']> {
  const mail = await latestMail(work, 'quote', quoteId);
  if (mail === null) return null;
  const { state, recipient, sentAt, lastError } = mail;
  return { state, recipient, sentAt, lastError };
}

async function linkOf(work: Work, quoteId: number): Promise<QuoteReply['link']> {
  const link = await openLink(work, quoteId);
  return link === null ? null : { expiresAt: link.expiresAt };
}

async function otherRevisions(work: Work, quote: Quote): Promise<QuoteReply['revisions']> {
  const others = await work.em.find(
    Quote,
    { number: quote.number, id: { $ne: quote.id } },
    { orderBy: { revision: 'desc' } },
  );
  return others.map(({ id, revision, state }) => ({ id, revision, state }));
}
