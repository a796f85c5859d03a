import { invalid, notFound, wrongState } from '../http/problem.ts';
import { logDeed } from '../modules/activity/activity-log.ts';
import { Customer } from '../modules/customers/customer.entity.ts';
import { Quote } from '../modules/quotes/quote.entity.ts';
import { requirePossible } from '../modules/quotes/quote-states.ts';
import type { Work } from '../work.ts';
import { handOverQuote, type HandedOver, type Way } from './hand-over-quote.ts';
import type { QuoteOnPaper } from './put-quote-on-paper.ts';
import { supersedeOthers } from './supersede-quotes.ts';

/**
 * Sends a draft: it never changes again, an earlier revision that was out is superseded, and the customer gets a
 * link, by a mail in the outbox or by hand.
 * @throws {Problem} 409 when it is no draft; 422 when it cannot go by mail, or its day in hands is over
 */
export async function sendQuote(
  work: Work,
  quoteId: number,
  way: Way,
  drawn: QuoteOnPaper,
): Promise<HandedOver> {
  const quote = await work.em.findOne(Quote, quoteId);
  if (quote === null) throw notFound('quote');
  requirePossible(quote, 'send');
  requireSame(quote, drawn);
  if (quote.inHandsOn !== null && quote.inHandsOn < work.today) {
    throw invalid([
      {
        field: 'inHandsOn',
        message: 'The day in hands is over. Choose a later one, then send the quote.',
      },
    ]);
  }
  await supersedeOthers(work, quote);
  quote.state = 'sent';
  quote.sentAt = work.now.toISOString();
  quote.validUntil = drawn.paper.validUntil;
  await work.em.flush();
  const handed = await handOverQuote(work, quote, way, drawn);
  const { name } = await work.em.findOneOrFail(Customer, quote.customerId);
  await logDeed(work, {
    action: `sent quote ${quote.number} to ${name}`,
    subjectKind: 'quote',
    subjectId: quote.id,
    detail: { by: way.by, revision: quote.revision },
  });
  return handed;
}

function requireSame(quote: Quote, drawn: QuoteOnPaper): void {
  if (quote.version === drawn.version) return;
  throw wrongState(
    `Quote ${quote.number} was changed while its paper was drawn. Look at it again, then send it.`,
    ['send'],
  );
}
