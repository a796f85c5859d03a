import { invalid, notFound, wrongState } from '../http/problem.ts';
import { logDeed } from '../modules/activity/activity-log.ts';
import { QuoteBreak } from '../modules/quotes/quote-break.entity.ts';
import { Quote } from '../modules/quotes/quote.entity.ts';
import { numbersOfQuote } from '../modules/quotes/quote-numbers.ts';
import { notNow, requirePossible } from '../modules/quotes/quote-states.ts';
import type { Work } from '../work.ts';
import { supersedeOthers } from './supersede-quotes.ts';

interface Agreement {
  quoteId: number;
  quantity: number;
  /** One of the quote's options; null for the piece as it is. */
  option: string | null;
  how: 'link' | 'phone' | 'mail' | 'counter';
}

/**
 * Notes that the customer agreed to one of the quantities offered. Agreeing again to the same changes nothing.
 * @throws {Problem} 409 in another state, or by the link once the offer has run out; 422 for a quantity not offered
 */
export async function agreeQuote(work: Work, asked: Agreement): Promise<Quote> {
  const quote = await work.em.findOne(Quote, asked.quoteId);
  if (quote === null) throw notFound('quote');
  if (quote.state === 'agreed') return sameAgreement(quote, asked);
  requirePossible(quote, 'agree');
  if (asked.how === 'link') requireStillGood(work, quote);
  await requireOffered(work, quote, asked.quantity);
  requireOption(quote, asked.option);
  await supersedeOthers(work, quote);
  quote.state = 'agreed';
  quote.agreedAt = work.now.toISOString();
  quote.agreedQuantity = asked.quantity;
  quote.agreedHow = asked.how;
  quote.agreedOption = asked.option;
  await work.em.flush();
  await logDeed(work, {
    action:
      asked.how === 'link'
        ? `agreed to quote ${quote.number}`
        : `noted that quote ${quote.number} was agreed`,
    subjectKind: 'quote',
    subjectId: quote.id,
    detail: { quantity: asked.quantity, option: asked.option, how: asked.how },
  });
  return quote;
}

function sameAgreement(quote: Quote, { quantity, option }: Agreement): Quote {
  if (quote.agreedQuantity === quantity && quote.agreedOption === option) return quote;
  throw notNow(quote);
}

function requireOption(quote: Quote, option: string | null): void {
  const offered = numbersOfQuote(quote).options.map(({ name }) => name);
  if (option === null || offered.includes(option)) return;
  const message =
    offered.length === 0
      ? 'This quote has no options. Agree to the piece as it is.'
      : `Choose one of the options offered: ${offered.join(', ')}.`;
  throw invalid([{ field: 'option', message }]);
}

function requireStillGood(work: Work, quote: Quote): void {
  if (quote.state === 'sent' && quote.validUntil !== null && quote.validUntil >= work.today) return;
  throw wrongState('This offer has run out. Ask the shop for a new one.');
}

async function requireOffered(work: Work, quote: Quote, quantity: number): Promise<void> {
  const rungs = await work.em.find(
    QuoteBreak,
    { quoteId: quote.id },
    { orderBy: { quantity: 'asc' } },
  );
  if (rungs.some((rung) => rung.quantity === quantity)) return;
  const offered = rungs.map((rung) => rung.quantity).join(', ');
  throw invalid([
    { field: 'quantity', message: `Choose one of the quantities offered: ${offered}.` },
  ]);
}
