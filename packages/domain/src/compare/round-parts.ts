import { Decimal } from 'decimal.js';
import { Exact } from '../numbers/decimal-text.ts';

/**
 * Rounds parts to so many places so that they still add up: each is cut down, and the units left over go
 * to the largest remainders, ties to the earlier. Parts may be negative; their exact sum is a whole
 * number of units (differences of amounts that were rounded before).
 */
export function roundParts(parts: readonly Decimal[], places: number): Decimal[] {
  const unit = new Exact(10).pow(-places);
  const down = parts.map((part) => part.toDecimalPlaces(places, Decimal.ROUND_FLOOR));
  const sum = (values: readonly Decimal[]) =>
    values.reduce((total, value) => total.plus(value), new Exact(0));
  const left = sum(parts).minus(sum(down)).div(unit).round().toNumber();
  const byRest = parts
    .map((part, at) => ({ rest: part.minus(down[at] ?? 0), at }))
    .sort((a, b) => b.rest.comparedTo(a.rest) || a.at - b.at);
  const raised = new Set(byRest.slice(0, left).map(({ at }) => at));
  return down.map((value, at) => (raised.has(at) ? value.plus(unit) : value));
}
