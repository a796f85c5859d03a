import { logDeed } from '../modules/activity/activity-log.ts';
import { Invoice } from '../modules/invoices/invoice.entity.ts';
import { findOrder } from '../modules/orders/find-order.ts';
import type { Work } from '../work.ts';

/** An order is closed once it is shipped and its invoice is paid, whichever comes last. */
export async function closeIfSettled(work: Work, orderId: number): Promise<void> {
  const order = await findOrder(work.em, orderId);
  if (order.state !== 'shipped') return;
  if ((await work.em.findOne(Invoice, { orderId, state: 'paid' })) === null) return;
  order.state = 'closed';
  await work.em.flush();
  await logDeed(work, {
    action: `closed ${order.number}`,
    subjectKind: 'order',
    subjectId: order.id,
  });
}
