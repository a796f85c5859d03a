import type { Awaited } from '@hidewright/contract';
import { wrongState } from '../http/problem.ts';
import { logDeed } from '../modules/activity/activity-log.ts';
import { Job } from '../modules/jobs/job.entity.ts';
import { findOrder } from '../modules/orders/find-order.ts';
import type { Order } from '../modules/orders/order.entity.ts';
import {
  allowedFor,
  arrivalWords,
  isAwaiting,
  stateAwaiting,
} from '../modules/orders/order-states.ts';
import { PatternVersion } from '../modules/patterns/pattern-version.entity.ts';
import type { Tool } from '../modules/tools/tool.entity.ts';
import type { Work } from '../work.ts';
import { toolsFor } from './choose-tools.ts';

/**
 * Notes that the proof is approved, the deposit received or the tooling here; when nothing is awaited any more, the
 * job is ready for the bench.
 * @throws {Problem} 409 when it is not awaited
 */
export async function noteArrival(work: Work, orderId: number, what: Awaited): Promise<Order> {
  const order = await findOrder(work.em, orderId);
  if (!order.awaits.includes(what)) throw notAwaited(order, what);
  order.awaits = order.awaits.filter((each) => each !== what);
  order.state = stateAwaiting(order.awaits);
  await work.em.flush();
  const action = `noted for ${order.number}: ${arrivalWords(what)}`;
  await logDeed(work, {
    action,
    subjectKind: 'order',
    subjectId: order.id,
    detail: { state: order.state },
  });
  if (what === 'tooling') await rackWhatWasOrdered(work, order);
  if (order.awaits.length === 0) await makeReady(work, order);
  return order;
}

/** The die or plate that was on order for this run is on the rack now. */
async function rackWhatWasOrdered(work: Work, order: Order): Promise<void> {
  const job = await work.em.findOneOrFail(Job, { orderId: order.id });
  const { patternId } = await work.em.findOneOrFail(PatternVersion, job.patternVersionId);
  for (const kind of ['cutting die', 'stamp plate'] as const) {
    const tools = await toolsFor(work.em, kind, { patternId, customerId: order.customerId });
    for (const tool of tools.filter(({ state }) => state === 'on order')) await rack(work, tool);
  }
}

async function rack(work: Work, tool: Tool): Promise<void> {
  tool.state = 'on the rack';
  await work.em.flush();
  await logDeed(work, {
    action: `put ${tool.kind} ${tool.number} on the rack`,
    subjectKind: 'tool',
    subjectId: tool.id,
  });
}

async function makeReady(work: Work, order: Order): Promise<void> {
  const job = await work.em.findOneOrFail(Job, { orderId: order.id });
  job.state = 'ready';
  await work.em.flush();
  await logDeed(work, {
    action: `laid ${job.number} ready for the bench`,
    subjectKind: 'job',
    subjectId: job.id,
  });
}

function notAwaited(order: Order, what: Awaited) {
  const rest = order.awaits.map(arrivalWords);
  const awaits = rest.length > 0 ? `It awaits: ${rest.join(', ')}.` : 'It awaits nothing.';
  return wrongState(
    `${order.number} does not await ${what === 'tooling' ? 'tooling' : `the ${what}`}. ${awaits}`,
    isAwaiting(order.state) ? rest : allowedFor(order.state),
  );
}
