import type { Decimal } from 'decimal.js';
import { InvalidInput } from '../errors/domain-error.ts';
import {
  type DecimalText,
  Exact,
  readDecimal,
  readWhole,
  toPlaces,
} from '../numbers/decimal-text.ts';

/** A price per unit for the whole order, once it comes to `from` units. */
export interface PriceBreak {
  from: number;
  price: DecimalText;
}

/** Quantities at which ordering more, up to a later break, costs less in total. */
export interface PriceInversion {
  /** the first such quantity of this break */
  from: number;
  /** the last one, just before the next break */
  until: number;
  /** at most, which is at `until`; 2 places */
  saves: DecimalText;
}

export interface CheckedBreak {
  from: number;
  price: Decimal;
}

/**
 * Refuses price breaks that are none: none at all, out of order, not above zero. `from` is a whole
 * number, at least `least`.
 * @throws InvalidInput
 */
export function checkPriceBreaks(breaks: readonly PriceBreak[], least = 1): CheckedBreak[] {
  if (breaks.length === 0) throw new InvalidInput('breaks', 'Give at least one price break.');
  return breaks.map(({ from, price }, at) => {
    readWhole(from, `breaks.${at}.from`, least, 1_000_000_000);
    const before = breaks[at - 1];
    if (before && from <= before.from) {
      throw new InvalidInput(
        `breaks.${at}.from`,
        `Put the price breaks in order: ${from} comes after ${before.from}.`,
      );
    }
    const each = readDecimal(price, `breaks.${at}.price`, { min: 0, max: '1000000000000' });
    if (each.isZero()) {
      throw new InvalidInput(`breaks.${at}.price`, 'Write a price above 0 at every break.');
    }
    return { from, price: each };
  });
}

/**
 * Where a ladder of prices asks more for fewer: per break, the quantities q with q × price above the
 * cheapest total at which a later break begins.
 * @throws InvalidInput
 */
export function priceInversions(breaks: readonly PriceBreak[]): PriceInversion[] {
  const ladder = checkPriceBreaks(breaks);
  return ladder.flatMap((here, at) => {
    const later = ladder.slice(at + 1);
    const next = later[0];
    if (!next) return [];
    const cheapest = Exact.min(...later.map((each) => each.price.times(each.from)));
    const level = cheapest.div(here.price).floor().toNumber();
    const [from, until] = [Math.max(here.from, level + 1), next.from - 1];
    if (from > until) return [];
    return [{ from, until, saves: toPlaces(here.price.times(until).minus(cheapest), 2) }];
  });
}

/** The breaks, by their `from`, whose price is above that of the break before. @throws InvalidInput */
export function priceRises(breaks: readonly PriceBreak[]): number[] {
  const ladder = checkPriceBreaks(breaks);
  return ladder
    .filter(({ price }, at) => price.gt(ladder[at - 1]?.price ?? price))
    .map(({ from }) => from);
}
