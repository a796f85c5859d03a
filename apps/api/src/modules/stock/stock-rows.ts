import type { Decimal } from 'decimal.js';
import type { EntityManager } from '@mikro-orm/sqlite';
import type { Work } from '../../work.ts';
import { refuseKit } from './refuse-kit.ts';
import { StockBalance } from './stock-balance.entity.ts';
import { keysOf, type StockItem } from './stock-item.ts';
import { StockMovement } from './stock-movement.entity.ts';

/* The rows that the ledger writes: nobody else does. */

interface Movement {
  kind: StockMovement['kind'];
  quantity: number;
  value: Decimal;
  jobId?: number | null;
  purchaseOrderId?: number | null;
  fromLotId?: number;
  purchaseLineId?: number;
  reason: string;
}

/** A movement and its balance, in one flush. */
export async function move(
  work: Work,
  item: StockItem,
  movement: Movement,
): Promise<StockMovement> {
  const balance = await balanceOf(work.em, item);
  balance.onHand += movement.quantity;
  const row = work.em.create(StockMovement, {
    ...movement,
    ...keysOf(item),
    at: work.now.toISOString(),
    day: work.today,
    actorId: work.actor.id,
    actorName: work.actor.name,
  });
  await work.em.flush();
  return row;
}

/** What is on hand of an item, as a row of its own; a new one where nothing ever was. */
export async function balanceOf(em: EntityManager, item: StockItem): Promise<StockBalance> {
  await refuseKit(em, item);
  const found = await em.findOne(StockBalance, keysOf(item));
  return found ?? em.create(StockBalance, { ...keysOf(item), onHand: 0, reserved: 0 });
}
