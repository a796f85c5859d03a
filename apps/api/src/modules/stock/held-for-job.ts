import type { EntityManager } from '@mikro-orm/sqlite';
import { Reservation } from './reservation.entity.ts';
import { keysOf, type StockItem } from './stock-item.ts';

/** How much of an item is still held for a job, as the ledger counts it. */
export async function heldForJob(
  em: EntityManager,
  jobId: number,
  item: StockItem,
): Promise<number> {
  const held = await em.find(Reservation, { ...keysOf(item), jobId, open: { $gt: 0 } });
  return held.reduce((sum, { open }) => sum + open, 0);
}
