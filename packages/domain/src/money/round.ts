import { Decimal } from 'decimal.js';
import { Exact, readWhole } from '../numbers/decimal-text.ts';

export type RoundingMode = 'halfUp' | 'halfEven';

/**
 * Rounds to so many places (0 to 20). Half up means away from zero (-0.005 → -0.01), half even to
 * the even neighbour (2.665 → 2.66). A zero never keeps a sign.
 * @throws InvalidInput
 */
export function round(
  value: Decimal | string | number,
  places: number,
  mode: RoundingMode = 'halfUp',
): Decimal {
  readWhole(places, 'places', 0, 20);
  const how = mode === 'halfUp' ? Decimal.ROUND_HALF_UP : Decimal.ROUND_HALF_EVEN;
  const rounded = new Exact(value).toDecimalPlaces(places, how);
  return rounded.isZero() ? rounded.abs() : rounded;
}
