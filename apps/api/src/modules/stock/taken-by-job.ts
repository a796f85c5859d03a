import { Decimal } from 'decimal.js';
import type { EntityManager } from '@mikro-orm/sqlite';
import { invalid } from '../../http/problem.ts';
import type { Work } from '../../work.ts';
import { describeItem } from './described-item.ts';
import { keysOf, type StockItem } from './stock-item.ts';
import { StockMovement } from './stock-movement.entity.ts';
import { shareOfCost } from './stock-value.ts';

interface Cut {
  jobId: number;
  fromLotId: number;
  /** Thousandths of mm², above 0. */
  quantity: number;
  /** Beside which its size was typed. */
  field: string;
}

/** What a job has taken and not brought back, as it was or as an offcut, and what that cost it. */
export async function takenBy(
  em: EntityManager,
  item: StockItem,
  jobId: number,
): Promise<{ taken: number; cost: Decimal }> {
  const { lotId } = keysOf(item);
  const own = { ...keysOf(item), fromLotId: null, kind: { $in: ['take', 'return'] as const } };
  const moved = await em.find(StockMovement, {
    jobId,
    ...(lotId === null ? own : { $or: [own, { fromLotId: lotId }] }),
  });
  return {
    taken: moved.reduce((sum, movement) => sum - movement.quantity, 0),
    cost: moved.reduce((sum, movement) => sum.minus(movement.value), new Decimal(0)),
  };
}

/**
 * What an offcut of what a job has taken from a lot bears of its cost: its share by area, to the cent, so that the
 * job keeps the rest. All that was taken bears all of it.
 * @throws {Problem} 422 beside the size when the job has not taken as much
 */
export async function costOfOffcut(work: Work, asked: Cut): Promise<Decimal> {
  const { jobId, fromLotId: lotId, quantity } = asked;
  const { taken, cost } = await takenBy(work.em, { lotId }, jobId);
  if (quantity <= taken) return shareOfCost(quantity, { of: taken, cost });
  const { name, say } = await describeItem(work.em, { lotId });
  const message =
    taken === 0
      ? `Nothing of ${name} is out for this job. Take from it first.`
      : `This job has ${say(taken)} of ${name} out, and the offcut would be ${say(quantity)}. Measure it again.`;
  throw invalid([{ field: taken === 0 ? 'lotId' : asked.field, message }]);
}
