import type { Work } from '../../work.ts';
import { PurchaseLine } from './purchase-line.entity.ts';
import type { PurchaseOrder } from './purchase-order.entity.ts';

/** Writes down since when nothing more is awaited of the lines of an order, after whatever has changed about it. */
export async function noteAwaited(work: Work, order: PurchaseOrder): Promise<void> {
  const lines = await work.em.find(PurchaseLine, { purchaseOrderId: order.id });
  const over = order.state === 'received' || order.state === 'cancelled';
  for (const line of lines) {
    const done = over || line.closed || line.received >= line.quantity;
    line.awaitedUntil = done ? (line.awaitedUntil ?? work.today) : null;
  }
  await work.em.flush();
}
