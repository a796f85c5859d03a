import { invalid, notFound, wrongState } from '../../http/problem.ts';
import type { Work } from '../../work.ts';
import { logDeed } from '../activity/activity-log.ts';
import { noteAwaited } from './note-awaited.ts';
import { PurchaseLine } from './purchase-line.entity.ts';
import { PurchaseOrder } from './purchase-order.entity.ts';

interface Asked {
  /** Null for every line that is short. */
  lineId: number | null;
  expectedOn: string | null;
}

/**
 * What was closed short is awaited after all, and counted on again; of an order that is received the other lines that
 * are short stay closed.
 * @throws {Problem} 404, 409 when nothing of it was closed short, 422 when the day is over
 */
export async function reopenLines(work: Work, order: PurchaseOrder, asked: Asked): Promise<void> {
  const { lineId, expectedOn } = asked;
  const lines = await work.em.find(PurchaseLine, { purchaseOrderId: order.id });
  const line = lines.find(({ id }) => id === lineId);
  if (lineId !== null && line === undefined) throw notFound('line');
  requireSent(order);
  const short = lines.filter((each) => isShort(each, order));
  const wanted = line === undefined ? short : short.filter((each) => each === line);
  if (wanted.length === 0) throw notClosed(order, line);
  if (expectedOn !== null && expectedOn < work.today)
    throw invalid([{ field: 'expectedOn', message: 'Choose today or a later day.' }]);
  const from = order.state;
  for (const each of short) each.closed = !wanted.includes(each);
  for (const each of wanted) each.expectedOn = expectedOn ?? each.expectedOn;
  if (order.state === 'received') order.state = 'part received';
  await noteAwaited(work, order);
  // The lines are part of the order, so that the order's version rises with them.
  await work.em.nativeUpdate(PurchaseOrder, { id: order.id }, { note: order.note });
  await work.em.refresh(order);
  const positions = wanted.map(({ position }) => position).sort((a, b) => a - b);
  await logDeed(work, {
    action: `awaits line ${positions.join(', ')} of purchase order ${order.number} after all`,
    subjectKind: 'purchase order',
    subjectId: order.id,
    detail: { lines: positions, expectedOn, from, to: order.state },
  });
}

function requireSent({ number, state }: PurchaseOrder): void {
  if (state === 'draft') {
    throw wrongState(`${number} has not been sent: all of it is still to be ordered.`, ['send']);
  }
  if (state === 'cancelled') {
    throw wrongState(`${number} is cancelled. Draft another order instead.`, ['draft another']);
  }
}

/** Leather whose work was called off is back on its lot, and goes out again with another order. */
const isShort = (line: PurchaseLine, { state }: PurchaseOrder): boolean =>
  line.service === null && line.received < line.quantity && (line.closed || state === 'received');

function notClosed({ number }: PurchaseOrder, line: PurchaseLine | undefined) {
  if (line === undefined) return wrongState(`Nothing of ${number} was closed short.`);
  const where = `line ${line.position} of ${number}`;
  if (line.service !== null) {
    return wrongState(
      `What ${where} sends out is not missing. Where its work was called off, the leather is back on its lot: draft another order for it.`,
    );
  }
  return line.received < line.quantity
    ? wrongState(`The rest of ${where} is awaited already.`)
    : wrongState(`All of ${where} is here.`);
}
