import { wrongState } from '../http/problem.ts';
import { logDeed } from '../modules/activity/activity-log.ts';
import { Job } from '../modules/jobs/job.entity.ts';
import { findOrder } from '../modules/orders/find-order.ts';
import { OrderCancellation } from '../modules/orders/order-cancellation.entity.ts';
import { cancelledLetter } from '../modules/orders/order-letters.ts';
import type { Order } from '../modules/orders/order.entity.ts';
import { releaseReservations } from '../modules/stock/stock-ledger.ts';
import type { Work } from '../work.ts';
import { keepPacked } from './keep-finished.ts';
import { cancellationOutlook } from './order-changes/cancellation-outlook.ts';
import { tellCustomer, type Telling } from './order-changes/tell-customer.ts';
import { whyNotCancelled } from './order-changes/why-not-cancelled.ts';

interface Cancelling extends Telling {
  orderId: number;
  why: string;
  /** What the outlook stood for when it was read. */
  seen: string;
}

/**
 * Cancels an order for good: what its job holds is let go of, its bench hours are free with it, and good pieces that
 * are packed go on the shelf. What was taken stays the job's until it is brought back.
 * @throws {Problem} 404; 409 when something has left the shop, it is invoiced, or other was seen than is; 422 when the
 * customer cannot be told by mail
 */
export async function cancelOrder(work: Work, asked: Cancelling): Promise<Order> {
  const order = await findOrder(work.em, asked.orderId);
  const refusal = await whyNotCancelled(work.em, order);
  if (refusal !== undefined) throw wrongState(refusal.because, refusal.allowed);
  const job = await work.em.findOneOrFail(Job, { orderId: order.id });
  const outlook = await cancellationOutlook(work, { order, job }, asked.mailAvailable);
  if (outlook.seen !== asked.seen) throw movedOn(order);
  await releaseReservations(work, job.id);
  if (job.state === 'finished') await keepPacked(work, job, order);
  await close(work, order, asked.why);
  await tellCustomer(work, order, asked, cancelledLetter);
  const { held, purchaseOrders } = outlook;
  await logDeed(work, {
    action: `cancelled ${order.number}`,
    subjectKind: 'order',
    subjectId: order.id,
    detail: {
      why: asked.why,
      letGo: held,
      drafted: purchaseOrders.map(({ number }) => number),
      told: asked.tellCustomer,
    },
  });
  return order;
}

const movedOn = ({ number }: Order) =>
  wrongState(
    `${number} has moved on since you looked: something was taken, logged or bought for it. Nothing is cancelled. Look again at what cancelling does now.`,
    ['look again'],
  );

async function close(work: Work, order: Order, why: string): Promise<void> {
  order.state = 'cancelled';
  order.awaits = [];
  work.em.create(OrderCancellation, {
    orderId: order.id,
    at: work.now.toISOString(),
    why,
    actorId: work.actor.id,
    actorName: work.actor.name,
  });
  await work.em.flush();
}
