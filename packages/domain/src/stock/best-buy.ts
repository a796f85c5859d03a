import type { Decimal } from 'decimal.js';
import { type DecimalText, Exact, readDecimal, toPlaces, toText } from '../numbers/decimal-text.ts';
import { type CheckedOffer, checkOffer, type OfferTerms } from './supplier-offer.ts';

/** An offer with who makes it and how long they take. */
export interface BuyOffer extends OfferTerms {
  id: number;
  /** days until it is here, 0 or more */
  leadDays: number;
  preferred: boolean;
}

export interface Buying {
  /** in the unit that is counted */
  quantity: DecimalText;
  /** of one priced unit at that quantity */
  price: DecimalText;
  /** of all of it; 2 places */
  cost: DecimalText;
}

/** Going on to the next price break. */
export interface NextBreak extends Buying {
  /** beyond what would be bought otherwise */
  more: DecimalText;
  /** what it costs beyond that; below 0 where more costs less in total */
  dearerBy: DecimalText;
  worth: 'costs less' | 'little more' | 'no';
}

/** The ways to buy a needed quantity on one supplier's terms. */
export interface Buys {
  /** what is needed, raised to the minimum and to whole packs */
  plain: Buying;
  /** null beyond the last break */
  next: NextBreak | null;
  /** the least dear way to have at least what is needed */
  best: Buying;
}

export interface OfferedBuy extends Buys {
  id: number;
  leadDays: number;
  preferred: boolean;
}

export interface NeededInput {
  /** in the unit that is counted: pieces, or mm² of leather; above 0 */
  needed: DecimalText;
  /** how much of it one price is for: 1 piece, or the 92903.04 mm² of a ft² */
  pricedAmount?: DecimalText;
  /** what counts as little more, per cent of the plain cost */
  littlePercent?: DecimalText;
}

export interface BuyInput extends NeededInput {
  offers: readonly BuyOffer[];
}

/**
 * What a needed quantity really costs from each supplier, the least dear first: the minimum, whole
 * packs and the price of the break that the order reaches are counted in. Each cost is rounded once,
 * half up to the cent. At equal cost the preferred supplier comes first, then the quicker one.
 * @throws InvalidInput
 */
export function bestBuy({ offers, ...input }: BuyInput): OfferedBuy[] {
  return offers
    .map((offer) => {
      const { id, leadDays, preferred } = offer;
      return { id, leadDays, preferred, ...buyOnTerms(offer, input) };
    })
    .sort(byCost);
}

const byCost = (a: OfferedBuy, b: OfferedBuy): number =>
  new Exact(a.best.cost).comparedTo(b.best.cost) ||
  Number(b.preferred) - Number(a.preferred) ||
  a.leadDays - b.leadDays ||
  a.id - b.id;

/**
 * What a needed quantity really costs on one supplier's terms; see `bestBuy`.
 * @throws InvalidInput
 */
export function buyOnTerms(
  terms: OfferTerms,
  { needed, pricedAmount = '1', littlePercent = '5' }: NeededInput,
): Buys {
  const least = readDecimal(needed, 'needed', { min: 0, max: '1000000000000' });
  const per = readDecimal(pricedAmount, 'pricedAmount', { min: 0 });
  const little = readDecimal(littlePercent, 'littlePercent', { min: 0, max: 100 });
  const offer = checkOffer(terms);
  const first = soldQuantity(offer, least);
  const plain = buy(offer, first, per);
  // Within one break more always costs more, so that only its beginning can be the cheapest.
  const later = offer.breaks
    .filter(({ from }) => from.gt(first))
    .map(({ from }) => buy(offer, soldQuantity(offer, from), per));
  const best = [plain, ...later].reduce((a, b) => (new Exact(b.cost).lt(a.cost) ? b : a));
  const [next] = later;
  return { plain, next: next ? nextBreak(plain, next, little) : null, best };
}

/** The least quantity that is sold and is at least this. */
function soldQuantity({ minimum, multiple }: CheckedOffer, wanted: Decimal): Decimal {
  const least = Exact.max(minimum, wanted);
  return multiple === null ? least : least.div(multiple).ceil().times(multiple);
}

/**
 * The price of one priced unit that a quantity reaches, even where so much is not sold; below the first break the
 * first price holds.
 * @param quantity in the unit that is counted, 0 or more
 * @throws InvalidInput
 */
export function priceReached(terms: OfferTerms, quantity: DecimalText): DecimalText {
  const much = readDecimal(quantity, 'quantity', { min: 0, max: '1000000000000' });
  return toText(reached(checkOffer(terms), much));
}

function reached({ breaks }: CheckedOffer, quantity: Decimal): Decimal {
  const step = breaks.findLast(({ from }) => from.lte(quantity)) ?? breaks[0];
  return step?.price ?? new Exact(0);
}

function buy(offer: CheckedOffer, quantity: Decimal, per: Decimal): Buying {
  const price = reached(offer, quantity);
  const cost = toPlaces(quantity.times(price).div(per), 2);
  return { quantity: toText(quantity), price: toText(price), cost };
}

function nextBreak(plain: Buying, next: Buying, little: Decimal): NextBreak {
  const dearer = new Exact(next.cost).minus(plain.cost);
  const limit = new Exact(plain.cost).times(little).div(100);
  return {
    ...next,
    more: toText(new Exact(next.quantity).minus(plain.quantity)),
    dearerBy: toPlaces(dearer, 2),
    worth: dearer.lt(0) ? 'costs less' : dearer.lte(limit) ? 'little more' : 'no',
  };
}
