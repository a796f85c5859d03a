import { checkRunInput } from '../costing/check-run-input.ts';
import { costRun } from '../costing/cost-run.ts';
import type { RunInput } from '../costing/run-input.ts';
import { type DecimalText, Exact } from '../numbers/decimal-text.ts';
import { earn } from './earnings.ts';

const most = 100_000;

/**
 * The fewest pieces with which a price reaches the target per bench hour, setting up and tooling
 * spread over more of them; null where even 100,000 do not. Whole panels make the figure jump a
 * little and a minimum order would let a single piece reach it, so that is left aside, and the answer is bracketed, halved, and then looked for one panel further down.
 * @param priceEach as decimal text
 * @throws InvalidInput · NotWorkable
 */
export function quantityThatReaches(input: RunInput, priceEach: DecimalText): number | null {
  checkRunInput(input);
  const plain = { ...input, minimumOrder: '0' };
  const reaches = (quantity: number) =>
    new Exact(earn(plain, costRun(plain, quantity), priceEach).perBenchHour).gte(
      input.targetPerHour,
    );
  let [low, high] = [0, 1];
  while (!reaches(high)) {
    if (high === most) return null;
    [low, high] = [high, Math.min(most, high * 2)];
  }
  while (high - low > 1) {
    const middle = Math.floor((low + high) / 2);
    if (reaches(middle)) high = middle;
    else low = middle;
  }
  return fewestNear(high, Math.min(input.layout.pieces, 40), reaches);
}

function fewestNear(
  quantity: number,
  span: number,
  reaches: (quantity: number) => boolean,
): number {
  for (let fewer = Math.max(1, quantity - span); fewer < quantity; fewer += 1) {
    if (reaches(fewer)) return fewer;
  }
  return quantity;
}
