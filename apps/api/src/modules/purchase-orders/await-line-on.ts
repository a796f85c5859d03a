import { lineProgress } from '@hidewright/domain';
import { invalid, notFound, wrongState } from '../../http/problem.ts';
import { sayDay } from '../../say-day.ts';
import type { Work } from '../../work.ts';
import { logDeed } from '../activity/activity-log.ts';
import { PurchaseLine } from './purchase-line.entity.ts';
import { PurchaseOrder } from './purchase-order.entity.ts';

/**
 * Notes another day for what is still to come of a line, as its supplier says.
 * @throws {Problem} 404, 409 when nothing of it is awaited, 422 when the day is over
 */
export async function awaitLineOn(
  work: Work,
  order: PurchaseOrder,
  { lineId, expectedOn }: { lineId: number; expectedOn: string },
): Promise<void> {
  const line = await work.em.findOne(PurchaseLine, { id: lineId, purchaseOrderId: order.id });
  if (line === null) throw notFound('line');
  const awaited = (order.state === 'sent' || order.state === 'part received') && !line.closed;
  const { toCome } = lineProgress({ ordered: line.quantity, received: line.received }, awaited);
  if (toCome === 0) {
    throw wrongState(`Nothing more is awaited on line ${line.position} of ${order.number}.`);
  }
  if (expectedOn < work.today)
    throw invalid([{ field: 'expectedOn', message: 'Choose today or a later day.' }]);
  const from = line.expectedOn ?? order.expectedOn;
  line.expectedOn = expectedOn;
  await work.em.flush();
  // The line is part of the order, so that the order's version rises with it.
  await work.em.nativeUpdate(PurchaseOrder, { id: order.id }, { note: order.note });
  await work.em.refresh(order);
  await logDeed(work, {
    action: `awaits line ${line.position} of purchase order ${order.number} on ${sayDay(expectedOn)}`,
    subjectKind: 'purchase order',
    subjectId: order.id,
    detail: { line: line.position, from, to: expectedOn },
  });
}
