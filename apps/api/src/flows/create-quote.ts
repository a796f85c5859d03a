import type { QuoteBody } from '@hidewright/contract';
import { drawPaperNumber } from '../db/counters.ts';
import { logDeed } from '../modules/activity/activity-log.ts';
import { Quote } from '../modules/quotes/quote.entity.ts';
import type { Work } from '../work.ts';
import type { LaidPattern } from './lay-pattern.ts';
import { keepRungs, workOutQuote } from './work-out-quote.ts';

/**
 * Drafts a quote: draws its number, keeps the layout, takes the snapshot and prices it.
 * @param laid the pattern's latest version with its layout: `await layPattern(context, asked.patternId)`, before the transaction
 * @throws {Problem} 422 when the customer does not exist or the run cannot be priced
 */
export async function createQuote(work: Work, asked: QuoteBody, laid: LaidPattern): Promise<Quote> {
  const workedOut = await workOutQuote(work, asked, laid);
  const quote = work.em.create(Quote, {
    ...workedOut,
    number: await drawPaperNumber(work.em, 'Q'),
    state: 'draft',
    createdAt: work.now.toISOString(),
  });
  await work.em.flush();
  keepRungs(work, quote.id, workedOut);
  await logDeed(work, {
    action: `drafted quote ${quote.number}`,
    subjectKind: 'quote',
    subjectId: quote.id,
  });
  return quote;
}
