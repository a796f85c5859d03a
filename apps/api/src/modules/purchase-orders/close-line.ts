import { notFound, wrongState } from '../../http/problem.ts';
import type { Work } from '../../work.ts';
import { logDeed } from '../activity/activity-log.ts';
import { noteAwaited } from './note-awaited.ts';
import { PurchaseLine } from './purchase-line.entity.ts';
import { PurchaseOrder } from './purchase-order.entity.ts';

/**
 * Nothing more of a line is to come: what is missing of it is short, and no longer counted on. Where it was the last
 * that was awaited, the order is received.
 * @throws {Problem} 404, 409 when nothing of it is awaited, or nothing at all of the order has come or will come
 */
export async function closeLine(
  work: Work,
  order: PurchaseOrder,
  { lineId, reason }: { lineId: number; reason: string },
): Promise<void> {
  const lines = await work.em.find(PurchaseLine, { purchaseOrderId: order.id });
  const line = lines.find(({ id }) => id === lineId);
  if (line === undefined) throw notFound('line');
  requireAwaited(order, line);
  const othersDone = lines.every((each) => each === line || !isOpen(each));
  if (othersDone && lines.every(({ received }) => received === 0)) {
    const sentence = `Nothing of ${order.number} has come, and nothing else of it is awaited. Cancel the order instead.`;
    throw wrongState(sentence, ['cancel']);
  }
  const from = order.state;
  line.closed = true;
  if (othersDone) order.state = 'received';
  await noteAwaited(work, order);
  // The line is part of the order, so that the order's version rises with it.
  await work.em.nativeUpdate(PurchaseOrder, { id: order.id }, { note: order.note });
  await work.em.refresh(order);
  await logDeed(work, {
    action: `closed line ${line.position} of purchase order ${order.number}: nothing more of it is to come`,
    subjectKind: 'purchase order',
    subjectId: order.id,
    detail: { line: line.position, reason, from, to: order.state },
  });
}

const isOpen = ({ received, quantity, closed }: PurchaseLine): boolean =>
  !closed && received < quantity;

function requireAwaited(order: PurchaseOrder, line: PurchaseLine): void {
  if (order.state === 'draft') {
    const sentence = `${order.number} has not been sent. Take the line out of the draft instead.`;
    throw wrongState(sentence, ['change']);
  }
  const awaited = order.state === 'sent' || order.state === 'part received';
  if (awaited && isOpen(line)) return;
  throw wrongState(`Nothing more is awaited on line ${line.position} of ${order.number}.`);
}
