import type { BodyOf, returnToSupplier as endpoint } from '@hidewright/contract';
import { invalid, wrongState } from '../http/problem.ts';
import { logDeed } from '../modules/activity/activity-log.ts';
import { findPurchaseOrder } from '../modules/purchase-orders/draft-purchase-order.ts';
import { ReceiptLine } from '../modules/receipts/receipt-line.entity.ts';
import { Receipt } from '../modules/receipts/receipt.entity.ts';
import { describeItem } from '../modules/stock/described-item.ts';
import type { StockItem } from '../modules/stock/stock-item.ts';
import { freeOf, rejectStock } from '../modules/stock/stock-ledger.ts';
import { StockMovement } from '../modules/stock/stock-movement.entity.ts';
import type { Work } from '../work.ts';
import { claimWhatWentBack } from './claim-what-went-back.ts';

type Asked = BodyOf<typeof endpoint>;

/**
 * Sends back to its supplier what came on an order: all that is left of a lot, or so much of a hardware. It leaves
 * the stock at what it stands at, and what was paid for it is owed until it is credited.
 * @throws {Problem} 409 when it is held for jobs or has gone already, 422 when it did not come on this order
 */
export async function returnToSupplier(
  work: Work,
  orderId: number,
  asked: Asked,
): Promise<StockMovement> {
  const order = await findPurchaseOrder(work, orderId);
  const item: StockItem =
    asked.of === 'lot' ? { lotId: asked.lotId } : { hardwareId: asked.hardwareId };
  const lines = await cameOn(work, orderId, item);
  if (lines.length === 0) throw notOnOrder(asked);
  const { name, say } = await describeItem(work.em, item);
  const quantity = asked.of === 'lot' ? (await freeOf(work.em, item)).onHand : asked.quantity;
  if (quantity === 0) throw wrongState(`Nothing is left of ${name} that could go back.`);
  const came = lines.reduce((sum, line) => sum + line.quantity, 0);
  const most = came - (await wentBack(work, orderId, item));
  if (asked.of === 'hardware' && quantity > most) {
    const message = `${say(most)} of ${name} came on ${order.number} and did not go back yet. Enter at most that.`;
    throw invalid([{ field: 'quantity', message }]);
  }
  const { reason } = asked;
  const movement = await rejectStock(work, { ...item, quantity, purchaseOrderId: orderId, reason });
  await claimWhatWentBack(work, orderId, movement, lines);
  await logDeed(work, {
    action: `sent back ${say(quantity)} of ${name} on purchase order ${order.number}`,
    subjectKind: 'purchase order',
    subjectId: orderId,
    detail: { reason },
  });
  return movement;
}

function notOnOrder(asked: Asked) {
  return asked.of === 'lot'
    ? invalid([{ field: 'lotId', message: 'Choose a lot that came on this order.' }])
    : invalid([{ field: 'hardwareId', message: 'Choose hardware that came on this order.' }]);
}

async function cameOn(
  { em }: Work,
  purchaseOrderId: number,
  item: StockItem,
): Promise<ReceiptLine[]> {
  const receipts = await em.find(Receipt, { purchaseOrderId });
  const receiptId = receipts.map(({ id }) => id);
  return em.find(ReceiptLine, { receiptId, ...item });
}

async function wentBack({ em }: Work, purchaseOrderId: number, item: StockItem): Promise<number> {
  const moved = await em.find(StockMovement, { ...item, purchaseOrderId, kind: 'reject' });
  return moved.reduce((sum, movement) => sum - movement.quantity, 0);
}
