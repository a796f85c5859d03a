import type { Decimal } from 'decimal.js';
import { InvalidInput } from '../errors/domain-error.ts';
import {
  type DecimalText,
  Exact,
  readDecimal,
  readWhole,
  toPlaces,
} from '../numbers/decimal-text.ts';

/**
 * Splits an amount by weights so that the parts sum to it exactly: each part is cut down to the
 * unit, and the units left over go to the largest remainders, ties to the earlier (largest
 * remainder method, Hamilton 1792, from memory). Weights are 0 or more and not all 0.
 * @param places decimals of the parts, 0 to 12
 * @throws InvalidInput
 */
export function allocate(
  amount: DecimalText,
  weights: readonly (DecimalText | number)[],
  places = 2,
): DecimalText[] {
  readWhole(places, 'places', 0, 12);
  const scale = new Exact(10).pow(places);
  const units = readDecimal(amount, 'amount', { places }).times(scale);
  const shares = exactShares(units.abs(), readWeights(weights));
  const parts = handOutRest(units.abs(), shares);
  const sign = units.isNegative() ? -1 : 1;
  return parts.map((part) => toPlaces(part.times(sign).div(scale), places));
}

function readWeights(weights: readonly (DecimalText | number)[]): Decimal[] {
  const read = weights.map((weight, at) => {
    const text = typeof weight === 'number' ? new Exact(weight).toFixed() : weight;
    return readDecimal(text, `weights.${at}`, { min: 0 });
  });
  if (read.every((weight) => weight.isZero())) {
    throw new InvalidInput('weights', 'Give at least one weight above 0 to share the amount by.');
  }
  return read;
}

interface Share {
  whole: Decimal;
  /** what is left of this share, in units times the sum of the weights: a whole comparison, no division */
  rest: Decimal;
}

function exactShares(units: Decimal, weights: Decimal[]): Share[] {
  const sum = weights.reduce((total, weight) => total.plus(weight), new Exact(0));
  return weights.map((weight) => {
    const product = units.times(weight);
    const whole = product.divToInt(sum);
    return { whole, rest: product.minus(whole.times(sum)) };
  });
}

function handOutRest(units: Decimal, shares: Share[]): Decimal[] {
  const given = shares.reduce((total, share) => total.plus(share.whole), new Exact(0));
  const left = units.minus(given).toNumber();
  const order = shares
    .map((share, at) => ({ rest: share.rest, at }))
    .sort((a, b) => b.rest.comparedTo(a.rest) || a.at - b.at);
  const lucky = new Set(order.slice(0, left).map(({ at }) => at));
  return shares.map((share, at) => (lucky.has(at) ? share.whole.plus(1) : share.whole));
}
