import { logDeed } from '../../modules/activity/activity-log.ts';
import { findLot } from '../../modules/lots/find-lot.ts';
import { PurchaseLine } from '../../modules/purchase-orders/purchase-line.entity.ts';
import type { PurchaseOrder } from '../../modules/purchase-orders/purchase-order.entity.ts';
import { describeItem } from '../../modules/stock/described-item.ts';
import { sendOut } from '../../modules/stock/stock-ledger.ts';
import type { Work } from '../../work.ts';

/**
 * What an order has worked on leaves the rack with it.
 * @throws {Problem} 409 when less of a lot is free by now
 */
export async function sendLotsOut(work: Work, order: PurchaseOrder): Promise<void> {
  const lines = await work.em.find(
    PurchaseLine,
    { purchaseOrderId: order.id, service: { $ne: null } },
    { orderBy: { position: 'asc' } },
  );
  for (const { id, fromLotId, quantity, service } of lines) {
    const lot = await findLot(work.em, fromLotId ?? 0);
    await sendOut(work, {
      lotId: lot.id,
      quantity,
      purchaseOrderId: order.id,
      purchaseLineId: id,
      reason: `sent out for ${service ?? ''} on ${order.number}`,
    });
    const { say } = await describeItem(work.em, { lotId: lot.id });
    await logDeed(work, {
      action: `sent out ${say(quantity)} of lot ${lot.tag} for ${service ?? ''} on ${order.number}`,
      subjectKind: 'lot',
      subjectId: lot.id,
    });
  }
}
