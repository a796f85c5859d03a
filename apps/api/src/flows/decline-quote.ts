import { notFound } from '../http/problem.ts';
import { logDeed } from '../modules/activity/activity-log.ts';
import { Quote } from '../modules/quotes/quote.entity.ts';
import { requirePossible } from '../modules/quotes/quote-states.ts';
import type { Work } from '../work.ts';

/**
 * Notes that the customer declined: the link then says so.
 * @throws {Problem} 409 when the quote is neither a draft nor sent
 */
export async function declineQuote(
  work: Work,
  asked: { quoteId: number; reason: string },
): Promise<Quote> {
  const quote = await work.em.findOne(Quote, asked.quoteId);
  if (quote === null) throw notFound('quote');
  requirePossible(quote, 'decline');
  quote.state = 'declined';
  await work.em.flush();
  await logDeed(work, {
    action: `noted that quote ${quote.number} was declined`,
    subjectKind: 'quote',
    subjectId: quote.id,
    detail: { reason: asked.reason },
  });
  return quote;
}
