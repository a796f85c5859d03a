import { logDeed } from '../../modules/activity/activity-log.ts';
import { findLot } from '../../modules/lots/find-lot.ts';
import { PurchaseLine } from '../../modules/purchase-orders/purchase-line.entity.ts';
import type { PurchaseOrder } from '../../modules/purchase-orders/purchase-order.entity.ts';
import { describeItem } from '../../modules/stock/described-item.ts';
import { putBackUnworked } from '../../modules/stock/stock-ledger.ts';
import { readGoneOut } from '../../modules/stock/gone-out.ts';
import type { Work } from '../../work.ts';

/**
 * Work that was called off: the leather is on its lot again, at what it went out for, and its lines are closed.
 * What came back already stays as it came.
 * @param lineId only this line, where one is named
 */
export async function putLotsBack(
  work: Work,
  order: PurchaseOrder,
  lineId?: number,
): Promise<void> {
  const lines = await work.em.find(PurchaseLine, {
    ...(lineId !== undefined && { id: lineId }),
    purchaseOrderId: order.id,
    service: { $ne: null },
    received: 0,
  });
  for (const line of lines) await putBack(work, order, line);
}

async function putBack(work: Work, order: PurchaseOrder, line: PurchaseLine): Promise<void> {
  const { quantity, value } = await readGoneOut(work.em, line.id);
  if (quantity === 0) return;
  const lot = await findLot(work.em, line.fromLotId ?? 0);
  line.closed = true;
  await putBackUnworked(work, {
    ...{ lotId: lot.id, quantity, value },
    ...{ purchaseOrderId: order.id, purchaseLineId: line.id },
    reason: `back from ${line.service ?? ''} on ${order.number}, not done`,
  });
  const { say } = await describeItem(work.em, { lotId: lot.id });
  await logDeed(work, {
    action: `put back ${say(quantity)} on lot ${lot.tag}: the ${line.service ?? ''} on ${order.number} was called off`,
    subjectKind: 'lot',
    subjectId: lot.id,
  });
}
