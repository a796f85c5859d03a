import type { Decimal } from 'decimal.js';
import type { EntityManager } from '@mikro-orm/sqlite';
import { invalid, wrongState } from '../../http/problem.ts';
import type { Work } from '../../work.ts';
import { describeItem } from './described-item.ts';
import { Reservation } from './reservation.entity.ts';
import { move, moveHeld } from './stock-rows.ts';
import { StockBalance } from './stock-balance.entity.ts';
import { keysOf, type StockItem } from './stock-item.ts';
import { StockMovement } from './stock-movement.entity.ts';
import { notFreeToGo, requireQuantity, tooLittle } from './stock-refusals.ts';
import { costOfChange, costOfGoing, shareOfCost } from './stock-value.ts';
import { takenBy } from './taken-by-job.ts';

/*
 * The one place that writes movements, balances and reservations: they change together, so that what is kept always
 * equals what is written. Quantities are whole numbers as stored: thousandths of mm² of a lot, pieces of hardware.
 */

interface Received {
  quantity: number;
  /** What was paid for all of it. */
  value: Decimal;
  purchaseOrderId?: number | null;
  reason?: string;
}

interface JobQuantity {
  jobId: number;
  quantity: number;
}

interface Taken {
  /** Nobody's job: spoiled, or used in the shop. */
  jobId: number | null;
  quantity: number;
  reason?: string;
}

interface Adjusted {
  /** What was counted or measured on the rack, 0 or more. */
  counted: number;
  reason: string;
}

export interface Free {
  onHand: number;
  reserved: number;
  /** On hand and held for nobody; 0 when an honest count left less than is held. */
  free: number;
}

/** What of an item is on hand, held for jobs, and free. */
export async function freeOf(em: EntityManager, item: StockItem): Promise<Free> {
  const balance = await em.findOne(StockBalance, keysOf(item));
  const { onHand, reserved } = balance ?? { onHand: 0, reserved: 0 };
  return { onHand, reserved, free: Math.max(0, onHand - reserved) };
}

/** Puts on the rack what came in. */
export async function receiveStock(
  work: Work,
  received: Received & StockItem,
): Promise<StockMovement> {
  requireQuantity(received.quantity);
  const { quantity, value, purchaseOrderId = null, reason = '' } = received;
  return move(work, received, { kind: 'receive', quantity, value, purchaseOrderId, reason });
}

/**
 * Holds stock for a job.
 * @throws {Problem} 409 naming what is free when it is less
 */
export async function reserveStock(
  work: Work,
  asked: JobQuantity & StockItem,
): Promise<Reservation> {
  requireQuantity(asked.quantity);
  const { free } = await freeOf(work.em, asked);
  if (asked.quantity > free)
    throw await tooLittle(work, asked, { asked: asked.quantity, most: free });
  const { jobId, quantity } = asked;
  const reservation = work.em.create(Reservation, { ...keysOf(asked), jobId, quantity, open: 0 });
  await work.em.flush();
  await moveHeld(work, reservation, quantity);
  await work.em.flush();
  return reservation;
}

/**
 * Takes stock from the rack: first what is held for the job, then what is free.
 * @throws {Problem} 409 naming what the job can have when it is less
 */
export async function takeStock(work: Work, asked: Taken & StockItem): Promise<StockMovement> {
  const { jobId, quantity, reason = '' } = asked;
  requireQuantity(quantity);
  const { onHand, free } = await freeOf(work.em, asked);
  const held = jobId === null ? [] : await openReservations(work.em, { ...keysOf(asked), jobId });
  const own = held.reduce((sum, reservation) => sum + reservation.open, 0);
  const most = Math.min(onHand, own + free);
  if (quantity > most) throw await tooLittle(work, asked, { asked: quantity, most });
  const value = (await costOfGoing(work.em, asked, quantity)).negated();
  await useHeld(work, held, quantity);
  return move(work, asked, { kind: 'take', quantity: -quantity, value, jobId, reason });
}

/**
 * Puts back on the rack what a job had taken and did not use; it is free again.
 * @throws {Problem} 409 when the job has not taken as much
 */
export async function returnStock(
  work: Work,
  asked: JobQuantity & { reason?: string } & StockItem,
): Promise<StockMovement> {
  const { jobId, quantity, reason = '' } = asked;
  requireQuantity(quantity);
  const { taken, cost } = await takenBy(work.em, asked, jobId);
  if (quantity > taken) {
    const { name, say } = await describeItem(work.em, asked);
    throw wrongState(
      `This job has taken ${say(taken)} of ${name}; ${say(quantity)} cannot come back. Return less, or adjust the count.`,
      [`return up to ${say(taken)}`],
    );
  }
  const value = shareOfCost(quantity, { of: taken, cost });
  return move(work, asked, { kind: 'return', quantity, value, jobId, reason });
}

interface Offcut {
  lotId: number;
  jobId: number;
  /** The lot that the job took it from. */
  fromLotId: number;
  quantity: number;
  /** Its share of what that cost. */
  value: Decimal;
  reason: string;
}

/** Puts an offcut on the rack as a lot of its own: what the job took of the lot that it was cut from shrinks by it. */
export async function returnAsOffcut(
  work: Work,
  { lotId, ...cut }: Offcut,
): Promise<StockMovement> {
  requireQuantity(cut.quantity);
  return move(work, { lotId }, { kind: 'return', ...cut });
}

/** Takes a receipt out of the books again, so that it can be written at another cost: both rows stay. */
export async function undoReceipt(
  work: Work,
  received: Received & StockItem,
): Promise<StockMovement> {
  requireQuantity(received.quantity);
  const { quantity, value, purchaseOrderId = null, reason = '' } = received;
  const back = { quantity: -quantity, value: value.negated() };
  return move(work, received, { kind: 'receive', ...back, purchaseOrderId, reason });
}

/**
 * Takes off the rack what goes back to its supplier, at what it stands at.
 * @throws {Problem} 409 naming what is free, and what jobs hold, when it is less
 */
export async function rejectStock(
  work: Work,
  asked: { quantity: number; purchaseOrderId: number; reason: string } & StockItem,
): Promise<StockMovement> {
  const { quantity, purchaseOrderId, reason } = asked;
  requireQuantity(quantity);
  const { free, reserved } = await freeOf(work.em, asked);
  if (quantity > free) {
    const { name, say } = await describeItem(work.em, asked);
    throw wrongState(
      `Of ${name} ${say(free)} is free and ${say(reserved)} is held for jobs, so ${say(quantity)} cannot go back. Send back less, or let the jobs go first.`,
      free > 0 ? [`send back up to ${say(free)}`] : [],
    );
  }
  const value = (await costOfGoing(work.em, asked, quantity)).negated();
  return move(work, asked, { kind: 'reject', quantity: -quantity, value, purchaseOrderId, reason });
}

interface Out {
  lotId: number;
  quantity: number;
  /** The order that sends it out, and its line. */
  purchaseOrderId: number;
  purchaseLineId: number;
  reason: string;
}

/**
 * Takes leather off the rack that goes out to be worked on, at what it stands at.
 * @throws {Problem} 409 naming what is free, and which jobs hold the rest, when it is less
 */
export async function sendOut(work: Work, { lotId, ...out }: Out): Promise<StockMovement> {
  requireQuantity(out.quantity);
  const { free } = await freeOf(work.em, { lotId });
  if (out.quantity > free) throw await notFreeToGo(work, { lotId, quantity: out.quantity, free });
  const value = (await costOfGoing(work.em, { lotId }, out.quantity)).negated();
  return move(work, { lotId }, { kind: 'take', ...out, quantity: -out.quantity, value });
}

/** Puts back on its lot what was out and comes back as it went, at what it went for. */
export async function putBackUnworked(
  work: Work,
  { lotId, ...back }: Out & { value: Decimal },
): Promise<StockMovement> {
  requireQuantity(back.quantity);
  return move(work, { lotId }, { kind: 'return', ...back });
}

/**
 * Sets what is on hand to what was counted. A count that agrees moves nothing; one that leaves less than is held for
 * jobs names the reservations that now stand on too little.
 */
export async function adjustStock(
  work: Work,
  asked: Adjusted & StockItem,
): Promise<{ movement: StockMovement | null; broken: Reservation[] }> {
  if (!Number.isSafeInteger(asked.counted) || asked.counted < 0) {
    throw invalid([{ field: 'counted', message: 'Enter what is there: 0 or more.' }]);
  }
  const { onHand, reserved } = await freeOf(work.em, asked);
  const quantity = asked.counted - onHand;
  const value = await costOfChange(work.em, asked, quantity);
  const movement =
    quantity === 0
      ? null
      : await move(work, asked, {
          kind: 'adjust',
          quantity,
          value,
          reason: asked.reason,
        });
  return {
    movement,
    broken: asked.counted < reserved ? await openReservations(work.em, keysOf(asked)) : [],
  };
}

/**
 * Adds to the books what a count found more, or takes from them what it found less.
 * @throws {RangeError} when less than nothing would be left; whoever asks has to see to that
 */
export async function postCount(
  work: Work,
  { difference, reason, ...item }: { difference: number; reason: string } & StockItem,
): Promise<StockMovement> {
  const { onHand } = await freeOf(work.em, item);
  if (onHand + difference < 0) throw new RangeError('A count never leaves less than nothing');
  const value = await costOfChange(work.em, item, difference);
  return move(work, item, { kind: 'count', quantity: difference, value, reason });
}

/** What the books said was on hand at an instant. */
export async function onHandAt(em: EntityManager, item: StockItem, at: string): Promise<number> {
  const { lotId, hardwareId } = keysOf(item);
  const [row] = await em.execute<[{ on_hand: number }]>(
    `SELECT COALESCE(SUM(quantity), 0) AS on_hand FROM stock_movement
     WHERE lot_id IS ? AND hardware_id IS ? AND at <= ?`,
    [lotId, hardwareId, at],
  );
  return row.on_hand;
}

/** Whether an item was counted or adjusted after an instant, so that an earlier count says nothing any more. */
export async function setSince(em: EntityManager, item: StockItem, at: string): Promise<boolean> {
  const set = { ...keysOf(item), kind: { $in: ['adjust', 'count'] as const }, at: { $gt: at } };
  return (await em.count(StockMovement, set)) > 0;
}

/** Lets go of everything that is still held for a job, or of one item; gives how much that was. */
export async function releaseReservations(
  work: Work,
  jobId: number,
  item?: StockItem,
): Promise<number> {
  let released = 0;
  for (const reservation of await openReservations(work.em, { jobId, ...(item && keysOf(item)) })) {
    released += reservation.open;
    await moveHeld(work, reservation, -reservation.open);
  }
  await work.em.flush();
  return released;
}

async function openReservations(
  em: EntityManager,
  where: { jobId?: number; lotId?: number | null; hardwareId?: number | null },
): Promise<Reservation[]> {
  return em.find(Reservation, { ...where, open: { $gt: 0 } }, { orderBy: { id: 'asc' } });
}

async function useHeld(work: Work, held: Reservation[], quantity: number): Promise<void> {
  let left = quantity;
  for (const reservation of held) {
    const used = Math.min(left, reservation.open);
    if (used > 0) await moveHeld(work, reservation, -used);
    left -= used;
  }
}
