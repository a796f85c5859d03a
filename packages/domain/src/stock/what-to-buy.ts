import { type DecimalText, Exact, toAtMost, toText } from '../numbers/decimal-text.ts';
import { MM2_PER_FT2 } from '../units/measures.ts';
import { buyOnTerms } from './best-buy.ts';
import type { LeatherStock } from './check-stock.ts';
import type { OfferTerms } from './supplier-offer.ts';
import { type Wholes, wholesOf } from './wholes.ts';

/** What is bought of a thing so that enough of it comes; quantities in pieces, or in mm². */
export interface ToBuy {
  quantity: DecimalText;
  /** the least that is sold and would do; below `quantity` where a price break makes more cost less */
  plain: DecimalText;
  /** what could be had for the same money; null where nothing more is */
  sameCost: DecimalText | null;
}

export interface LeatherToBuy extends ToBuy {
  /** whole sides or hides, where it is known what it is bought as and they come out even */
  whole: Wholes | null;
}

/**
 * What to buy of a thing as its supplier sells it: at least the minimum, in full packs, and on to a price break that
 * costs less in total (`buyOnTerms`).
 * @param needed above 0
 * @param pricedAmount how much of it one price is for
 * @throws InvalidInput
 */
export function amountToBuy(
  terms: OfferTerms,
  needed: DecimalText,
  pricedAmount: DecimalText = '1',
): ToBuy {
  const { plain, next, best } = buyOnTerms(terms, { needed, pricedAmount });
  const paid = !new Exact(plain.cost).isZero();
  const same = next !== null && paid && new Exact(next.cost).eq(best.cost) ? next.quantity : null;
  return {
    quantity: best.quantity,
    plain: plain.quantity,
    sameCost: same === best.quantity ? null : same,
  };
}

/**
 * What to buy so that an area can be cut: its usable share is less than all of it, and it comes as it is sold.
 * @param usable thousandths of mm² to cut, above 0
 * @throws InvalidInput
 */
export function leatherToBuy(
  { whole, usablePercent, buying }: Pick<LeatherStock, 'whole' | 'usablePercent' | 'buying'>,
  usable: number,
): LeatherToBuy {
  const gross = new Exact(usable).div(1000).times(100).div(usablePercent);
  const needed = toAtMost(gross.toDecimalPlaces(3, Exact.ROUND_UP), 3);
  const toBuy = amountToBuy(buying.terms, needed, MM2_PER_FT2);
  return { ...toBuy, whole: wholesOf(whole, toBuy.quantity) };
}

/** How many full packs that is; null where any number is sold. */
export function packsOf({ multiple }: OfferTerms, quantity: DecimalText): number | null {
  if (multiple === null || new Exact(multiple).lte(1)) return null;
  return Number(toText(new Exact(quantity).div(multiple)));
}
