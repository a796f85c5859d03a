import type { Decimal } from 'decimal.js';
import type { EntityManager } from '@mikro-orm/sqlite';
import type { Work } from '../../work.ts';
import { refuseKit } from './refuse-kit.ts';
import { ReservationMovement } from './reservation-movement.entity.ts';
import type { Reservation } from './reservation.entity.ts';
import { StockBalance } from './stock-balance.entity.ts';
import { itemOf, keysOf, type StockItem } from './stock-item.ts';
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

/** What a reservation holds grows or shrinks, and with it what is held of the item; whoever asks flushes. */
export async function moveHeld(
  work: Work,
  reservation: Reservation,
  quantity: number,
): Promise<void> {
  const balance = await balanceOf(work.em, itemOf(reservation));
  balance.reserved += quantity;
  reservation.open += quantity;
  work.em.create(ReservationMovement, {
    reservationId: reservation.id,
    at: work.now.toISOString(),
    day: work.today,
    quantity,
  });
}

/** What is on hand of an item, as a row of its own; a new one where nothing ever was. */
async function balanceOf(em: EntityManager, item: StockItem): Promise<StockBalance> {
  await refuseKit(em, item);
  const found = await em.findOne(StockBalance, keysOf(item));
  return found ?? em.create(StockBalance, { ...keysOf(item), onHand: 0, reserved: 0 });
}
