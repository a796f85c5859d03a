import type { Decimal } from 'decimal.js';
import {
  type DecimalText,
  Exact,
  readDecimal,
  readWhole,
  toAtMost,
  toText,
} from '../numbers/decimal-text.ts';

export interface PricedPart {
  /** in one kit, 1 or more */
  quantity: number;
  /** of one, up to 4 places */
  unitPrice: DecimalText;
}

/** What one kit costs by its parts: Σ quantity × price. @throws InvalidInput */
export function kitPrice(parts: readonly PricedPart[]): DecimalText {
  return toText(sumOf(parts.map(readPart)));
}

/**
 * The price of each part so that the parts together cost what was typed for the kit: each its share by
 * what it costs alone (by count where all are free), rounded to 4 places; what rounding leaves goes to
 * the dearest part of which there is one, so that then not a ten-thousandth is lost.
 * @throws InvalidInput
 */
export function pricesInKit(typed: DecimalText, parts: readonly PricedPart[]): DecimalText[] {
  const total = readDecimal(typed, 'unitPrice', { min: 0, places: 4 });
  const read = parts.map(readPart);
  const free = sumOf(read).isZero();
  const weighed = read.map((part) => (free ? { ...part, price: new Exact(1) } : part));
  const weight = sumOf(weighed);
  const shares = weighed.map(({ quantity, price }) => ({
    quantity,
    price: total.times(price).div(weight).toDecimalPlaces(4),
  }));
  return settled(total, shares).map((price) => toAtMost(price, 4));
}

interface Part {
  quantity: number;
  price: Decimal;
}

const readPart = ({ quantity, unitPrice }: PricedPart, at: number): Part => ({
  quantity: readWhole(quantity, `parts.${at}.quantity`, 1),
  price: readDecimal(unitPrice, `parts.${at}.unitPrice`, { min: 0 }),
});

const sumOf = (parts: readonly Part[]): Decimal =>
  parts.reduce((sum, { quantity, price }) => sum.plus(price.times(quantity)), new Exact(0));

function settled(total: Decimal, shares: readonly Part[]): Decimal[] {
  const left = total.minus(sumOf(shares));
  const dearest = shares
    .filter(({ quantity }) => quantity === 1)
    .reduce<Part | null>((best, each) => (best?.price.gte(each.price) ? best : each), null);
  return shares.map((each) =>
    each === dearest ? Exact.max(0, each.price.plus(left)) : each.price,
  );
}
