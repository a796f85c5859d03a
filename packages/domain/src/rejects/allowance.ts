import { InvalidInput } from '../errors/domain-error.ts';
import { Exact, readWhole } from '../numbers/decimal-text.ts';

function readGoodShare(value: unknown, field: string): number {
  if (typeof value !== 'number' || !(value > 0) || !(value <= 1)) {
    throw new InvalidInput(field, 'Write the share that comes out good, above 0 and up to 1.');
  }
  return value;
}

/**
 * The share that survives all steps, and how many to start with so that `good` remain on average:
 * the rolled throughput yield, the product of the steps' good shares.
 * @throws InvalidInput
 */
export function rolledYield({ rates, good }: { rates: readonly number[]; good: number }): {
  yield: number;
  start: number;
} {
  const product = rates.reduce(
    (all, rate, at) => all.times(readGoodShare(rate, `rates.${at}`)),
    new Exact(1),
  );
  const start = new Exact(readWhole(good, 'good')).div(product);
  return { yield: product.toNumber(), start: ceilOf(start) };
}

/** good ÷ rate, rounded up: enough on average, and short about every other time. @throws InvalidInput */
export function plainAllowance(good: number, rate: number): number {
  return ceilOf(new Exact(readWhole(good, 'good')).div(readGoodShare(rate, 'rate')));
}

// The 20th place keeps 9 / 0.3 (30.000…01 by a division's last digit) from costing a piece.
const ceilOf = (value: InstanceType<typeof Exact>): number =>
  value.toDecimalPlaces(20).ceil().toNumber();

/**
 * Rounds a cut count up to whole containers (panels, strips or rows).
 * `overs` are the pieces beyond the count asked for.
 * @throws InvalidInput
 */
export function upToFull(
  pieces: number,
  perContainer: number,
): { containers: number; pieces: number; overs: number } {
  readWhole(pieces, 'pieces');
  readWhole(perContainer, 'perContainer', 1);
  const containers = Math.ceil(pieces / perContainer);
  const full = containers * perContainer;
  return { containers, pieces: full, overs: full - pieces };
}
