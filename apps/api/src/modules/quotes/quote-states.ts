import type { QuoteState } from '@hidewright/contract';
import { wrongState, type Problem } from '../../http/problem.ts';

type QuoteDeed = 'change' | 'send' | 'agree' | 'decline' | 'revise' | 'share' | 'take on';

const possible: Record<QuoteState, readonly QuoteDeed[]> = {
  draft: ['change', 'send', 'agree', 'decline'],
  sent: ['share', 'agree', 'decline', 'revise'],
  agreed: ['share', 'take on'],
  declined: ['revise'],
  superseded: [],
  lapsed: ['revise'],
};

const standing: Record<QuoteState, string> = {
  draft: 'is a draft. Change it, send it, or note that it was agreed.',
  sent: 'has been sent, and stays as it was sent. Make a revision to change it.',
  agreed: 'has been agreed. Take the order on from it.',
  declined: 'was declined. Make a revision to offer it again.',
  superseded: 'was replaced by a later revision. Go on with that one.',
  lapsed: 'has lapsed. Make a revision to offer it again.',
};

interface Standing {
  number: string;
  state: QuoteState;
}

/** @throws {Problem} 409 when the quote's state does not allow it, with what it does allow */
export function requirePossible(quote: Standing, deed: QuoteDeed): void {
  if (!possible[quote.state].includes(deed)) throw notNow(quote);
}

export function notNow(quote: Standing): Problem {
  return wrongState(`Quote ${quote.number} ${standing[quote.state]}`, [...possible[quote.state]]);
}
