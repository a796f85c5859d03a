import { type DecimalText, Exact, toText } from '../numbers/decimal-text.ts';
import { buyOnTerms, type Buying, type Buys } from './best-buy.ts';
import type { OfferTerms } from './supplier-offer.ts';

/** What a supplier's terms say to a quantity that somebody means to order. */
export interface OrderedQuantity {
  /** what can be had instead; null where this very quantity is sold */
  instead: {
    /** the next less that is sold; null where nothing less is */
    less: DecimalText | null;
    more: DecimalText;
    belowMinimum: boolean;
  } | null;
  /** a price break at which more costs less, the same or little more, beside what is bought without it */
  nextBreak: { plain: Buying; more: Buying } | null;
}

/**
 * Holds a quantity against a supplier's terms: whether so much is sold, and whether going on to a price break pays.
 * Where only the pack above reaches the break, the pack below is what it is held against.
 * @param quantity in the unit that is counted, above 0
 * @param pricedAmount how much of it one price is for
 * @throws InvalidInput
 */
export function judgeQuantity(
  terms: OfferTerms,
  quantity: DecimalText,
  pricedAmount: DecimalText = '1',
): OrderedQuantity {
  const buy = (needed: DecimalText) => buyOnTerms(terms, { needed, pricedAmount });
  const bought = buy(quantity);
  const more = bought.plain.quantity;
  if (new Exact(more).eq(quantity)) return { instead: null, nextBreak: breakWorth(bought) };
  const less = lessSold(terms, more);
  const nextBreak = breakWorth(bought) ?? (less === null ? null : breakWorth(buy(less)));
  const belowMinimum = terms.minimum !== null && new Exact(quantity).lt(terms.minimum);
  return { instead: { less, more, belowMinimum }, nextBreak };
}

/** One pack less, unless that is nothing or below the minimum. */
function lessSold({ minimum, multiple }: OfferTerms, more: DecimalText): DecimalText | null {
  if (multiple === null) return null;
  const less = new Exact(more).minus(multiple);
  return less.gt(0) && less.gte(minimum ?? 0) ? toText(less) : null;
}

function breakWorth({ plain, next, best }: Buys): OrderedQuantity['nextBreak'] {
  if (new Exact(plain.cost).isZero()) return null;
  if (best.quantity !== plain.quantity) return { plain, more: best };
  return next === null || next.worth === 'no' ? null : { plain, more: next };
}
