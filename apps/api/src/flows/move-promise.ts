import type { Day } from '@hidewright/domain';
import { invalid, wrongState } from '../http/problem.ts';
import { logDeed } from '../modules/activity/activity-log.ts';
import { movedLetter } from '../modules/orders/order-letters.ts';
import type { Order } from '../modules/orders/order.entity.ts';
import { allowedFor } from '../modules/orders/order-states.ts';
import { PromiseMove } from '../modules/orders/promise-move.entity.ts';
import { sayDay } from '../say-day.ts';
import type { Work } from '../work.ts';
import { requireReachable } from './check/runs-asked.ts';
import { tellCustomer, type Telling } from './order-changes/tell-customer.ts';

interface Moving extends Telling {
  promisedOn: Day;
  why: string;
}

/**
 * Promises an order for another day; the day it was promised for is kept. Whether the bench can do it is asked before:
 * here it is the owner's word.
 * @throws {Problem} 409 when it is shipped, closed or cancelled; 422 for a day that is over, out of sight or no other
 */
export async function movePromise(work: Work, order: Order, asked: Moving): Promise<Order> {
  requireOpen(order);
  const { promisedOn: fromDay } = order;
  const { promisedOn: toDay, why } = asked;
  requireReachable(work, toDay, 'promisedOn');
  if (toDay === fromDay) {
    const message = `${order.number} is promised for ${sayDay(fromDay)} already. Choose another day.`;
    throw invalid([{ field: 'promisedOn', message }]);
  }
  order.promisedOn = toDay;
  work.em.create(PromiseMove, {
    ...{ orderId: order.id, fromDay, toDay, why },
    at: work.now.toISOString(),
    actorId: work.actor.id,
    actorName: work.actor.name,
  });
  await work.em.flush();
  await tellCustomer(work, order, asked, (about) => movedLetter(about, { fromDay, toDay }));
  await logDeed(work, {
    action: `moved the promised day of ${order.number} to ${sayDay(toDay)}`,
    subjectKind: 'order',
    subjectId: order.id,
    detail: { from: fromDay, to: toDay, why, told: asked.tellCustomer },
  });
  return order;
}

/** @throws {Problem} 409 when nothing of it is still to come */
export function requireOpen({ number, state }: Order): void {
  if (state !== 'shipped' && state !== 'closed' && state !== 'cancelled') return;
  throw wrongState(`${number} is ${state}, so its promised day stays as it is.`, allowedFor(state));
}
