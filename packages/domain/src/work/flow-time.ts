import type { Decimal } from 'decimal.js';
import { InvalidInput } from '../errors/domain-error.ts';
import { Exact, readWhole } from '../numbers/decimal-text.ts';
import { readNumber } from '../numbers/read-number.ts';

export interface FlowInput {
  /** pieces, 1 or more */
  quantity: number;
  /** time per piece at each step, in the order of work; 0 or more */
  times: readonly number[];
  /** pieces handed on together; the last batch may be smaller. The whole quantity, or more, is one batch */
  transfer: number;
}

/**
 * From the first piece begun to the last finished, in the unit of `times`: one bench per step, each
 * step takes the batches in turn and a batch moves on when all of it is done. For k equal batches of
 * b the step s ends at b (Σ t + (k − 1) max t) over the steps up to s; a smaller last batch follows.
 * @throws InvalidInput
 */
export function flowTime({ quantity, times, transfer }: FlowInput): number {
  readWhole(quantity, 'quantity', 1, 1_000_000_000);
  readWhole(transfer, 'transfer', 1, 1_000_000_000);
  if (times.length === 0) throw new InvalidInput('times', 'Give the time of at least one step.');
  const steps = times.map((time, at) => new Exact(readNumber(time, `times.${at}`, { min: 0 })));
  const batch = Math.min(quantity, transfer);
  const ends = endsOfEqualBatches(steps, batch, Math.floor(quantity / batch));
  return endOfLastBatch(steps, ends, quantity % batch).toNumber();
}

function endsOfEqualBatches(steps: readonly Decimal[], batch: number, count: number): Decimal[] {
  let [sum, slowest] = [new Exact(0), new Exact(0)];
  return steps.map((time) => {
    sum = sum.plus(time);
    slowest = Exact.max(slowest, time);
    return slowest
      .times(count - 1)
      .plus(sum)
      .times(batch);
  });
}

function endOfLastBatch(steps: Decimal[], ends: Decimal[], pieces: number): Decimal {
  return steps.reduce((ready, time, at) => {
    const free = ends[at] ?? ready;
    return (ready.gt(free) ? ready : free).plus(time.times(pieces));
  }, new Exact(0));
}
