import { invalid, wrongState } from '../http/problem.ts';
import { logDeed } from '../modules/activity/activity-log.ts';
import { findOrder } from '../modules/orders/find-order.ts';
import type { Order } from '../modules/orders/order.entity.ts';
import { allowedFor } from '../modules/orders/order-states.ts';
import type { Work } from '../work.ts';
import { closeIfSettled } from './close-order.ts';

/**
 * The packed order has left the shop.
 * @throws {Problem} 409 when it is not packed, 422 when the day is still to come or before it was taken on
 */
export async function shipOrder(work: Work, orderId: number, shippedOn: string): Promise<Order> {
  const order = await findOrder(work.em, orderId);
  if (order.state !== 'packed') {
    throw wrongState(
      `${order.number} is ${order.state}; only a packed order can be shipped.`,
      allowedFor(order.state),
    );
  }
  if (shippedOn > work.today) {
    throw invalid([
      { field: 'shippedOn', message: 'That day is still to come. Choose today or a day before.' },
    ]);
  }
  if (shippedOn < order.takenOnAt.slice(0, 10) && shippedOn !== work.today) {
    throw invalid([
      {
        field: 'shippedOn',
        message: 'The order was not taken on yet on that day. Choose a later day.',
      },
    ]);
  }
  order.state = 'shipped';
  order.shippedOn = shippedOn;
  await work.em.flush();
  await logDeed(work, {
    action: `shipped ${order.number}`,
    subjectKind: 'order',
    subjectId: order.id,
    detail: { shippedOn },
  });
  await closeIfSettled(work, order.id);
  return order;
}
