import { notFound, wrongState } from '../http/problem.ts';
import { logDeed } from '../modules/activity/activity-log.ts';
import { QuoteBreak } from '../modules/quotes/quote-break.entity.ts';
import { Quote } from '../modules/quotes/quote.entity.ts';
import { requirePossible } from '../modules/quotes/quote-states.ts';
import type { Work } from '../work.ts';

/**
 * Makes a new draft under the same number; the quote it comes from stays out until the new one is sent.
 * @throws {Problem} 409 in a state that cannot be revised, or while there is a draft already
 */
export async function reviseQuote(work: Work, quoteId: number): Promise<Quote> {
  const quote = await work.em.findOne(Quote, quoteId);
  if (quote === null) throw notFound('quote');
  requirePossible(quote, 'revise');
  const revision = await nextRevision(work, quote);
  const draft = work.em.create(Quote, {
    number: quote.number,
    revision,
    customerId: quote.customerId,
    patternVersionId: quote.patternVersionId,
    layoutId: quote.layoutId,
    title: quote.title,
    inHandsOn: quote.inHandsOn,
    state: 'draft',
    input: quote.input,
    numbers: quote.numbers,
    overrides: quote.overrides,
    message: quote.message,
    terms: quote.terms,
    createdAt: work.now.toISOString(),
  });
  await work.em.flush();
  await copyRungs(work, quote.id, draft.id);
  await logDeed(work, {
    action: `drafted revision ${revision} of quote ${quote.number}`,
    subjectKind: 'quote',
    subjectId: draft.id,
  });
  return draft;
}

async function nextRevision(work: Work, quote: Quote): Promise<number> {
  const all = await work.em.find(Quote, { number: quote.number });
  const draft = all.find((each) => each.state === 'draft');
  if (draft !== undefined) {
    throw wrongState(
      `Revision ${draft.revision} of quote ${quote.number} is a draft already. Go on with that one.`,
    );
  }
  const agreed = all.find((each) => each.state === 'agreed');
  if (agreed !== undefined) {
    throw wrongState(
      `Revision ${agreed.revision} of quote ${quote.number} has been agreed. Take the order on from it.`,
    );
  }
  return Math.max(...all.map((each) => each.revision)) + 1;
}

async function copyRungs(work: Work, fromId: number, toId: number): Promise<void> {
  for (const { quantity, typedPrice, priceEach, total } of await work.em.find(QuoteBreak, {
    quoteId: fromId,
  })) {
    work.em.create(QuoteBreak, { quoteId: toId, quantity, typedPrice, priceEach, total });
  }
  await work.em.flush();
}
