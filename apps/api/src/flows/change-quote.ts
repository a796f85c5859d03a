import type { QuoteBody } from '@hidewright/contract';
import { logDeed } from '../modules/activity/activity-log.ts';
import { QuoteBreak } from '../modules/quotes/quote-break.entity.ts';
import type { Quote } from '../modules/quotes/quote.entity.ts';
import { requirePossible } from '../modules/quotes/quote-states.ts';
import type { Work } from '../work.ts';
import type { LaidPattern } from './lay-pattern.ts';
import { keepRungs, workOutQuote } from './work-out-quote.ts';

/**
 * Works a draft out again from what is typed now, with today's prices and the pattern's latest version.
 * @throws {Problem} 409 when it is no draft; 422 as when it was created
 */
export async function changeQuote(
  work: Work,
  quote: Quote,
  asked: QuoteBody,
  laid: LaidPattern,
): Promise<Quote> {
  requirePossible(quote, 'change');
  const workedOut = await workOutQuote(work, asked, laid);
  await work.em.nativeDelete(QuoteBreak, { quoteId: quote.id });
  Object.assign(quote, workedOut);
  await work.em.flush();
  keepRungs(work, quote.id, workedOut);
  await logDeed(work, {
    action: `worked out quote ${quote.number} again`,
    subjectKind: 'quote',
    subjectId: quote.id,
    detail: { revision: quote.revision },
  });
  return quote;
}
