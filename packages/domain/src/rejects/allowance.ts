import { InvalidInput } from '../errors/domain-error.ts';
import { Exact, readWhole, upToWhole } from '../numbers/decimal-text.ts';

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

const ceilOf = (value: InstanceType<typeof Exact>): number => upToWhole(value).toNumber();

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

/**
 * Rounds a cut count up to full rows: whole containers first, then rows of the next one from its
 * beginning, each as long as it is.
 * @param perRow pieces in every row, or in each row of a container in cutting order
 * @throws InvalidInput
 */
export function upToFullRows(
  pieces: number,
  perRow: number | readonly number[],
): { rows: number; pieces: number; overs: number } {
  if (typeof perRow === 'number') {
    const { containers: rows, ...full } = upToFull(pieces, perRow);
    return { rows, ...full };
  }
  readWhole(pieces, 'pieces');
  perRow.forEach((count, at) => readWhole(count, `perRow.${at}`, 1));
  const perContainer = readWhole(
    perRow.reduce((sum, count) => sum + count, 0),
    'perRow',
    1,
  );
  const whole = Math.floor(pieces / perContainer);
  let [rows, full] = [whole * perRow.length, whole * perContainer];
  for (const count of perRow) {
    if (full >= pieces) break;
    rows += 1;
    full += count;
  }
  return { rows, pieces: full, overs: full - pieces };
}
