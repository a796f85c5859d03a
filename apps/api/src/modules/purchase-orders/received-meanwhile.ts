import { wrongState } from '../../http/problem.ts';
import type { Work } from '../../work.ts';
import { Receipt } from '../receipts/receipt.entity.ts';
import type { PurchaseOrder } from './purchase-order.entity.ts';

/** Names who was quicker and what came, so that the same delivery is not put on the rack twice. */
export async function receivedMeanwhile(work: Work, order: PurchaseOrder) {
  const last = await work.em.findOne(
    Receipt,
    { purchaseOrderId: order.id },
    { orderBy: { id: 'desc' } },
  );
  if (last === null) return wrongState(`Look at ${order.number} again, then receive what came.`);
  const came = await sayWhatCame(work, last.id);
  return wrongState(
    `${last.actorName} has received ${came} of ${order.number} after you opened it, and it is ${order.state} now. Look at what is there, then receive only what is still missing.`,
    ['look again', 'receive'],
  );
}

async function sayWhatCame({ em }: Work, receiptId: number): Promise<string> {
  const rows = await em.execute<{ pieces: number | null; name: string; lots: number }[]>(
    `SELECT SUM(CASE WHEN l.lot_id IS NULL THEN l.quantity END) AS pieces, COUNT(l.lot_id) AS lots,
       COALESCE(h.name, leather.name) AS name
     FROM receipt_line l LEFT JOIN hardware h ON h.id = l.hardware_id
     LEFT JOIN lot ON lot.id = l.lot_id LEFT JOIN leather ON leather.id = lot.leather_id
     WHERE l.receipt_id = ? GROUP BY h.id, leather.id ORDER BY MIN(l.position)`,
    [receiptId],
  );
  return rows
    .map(({ pieces, lots, name }) =>
      pieces === null ? `${lots} ${lots === 1 ? 'lot' : 'lots'} of ${name}` : `${pieces} × ${name}`,
    )
    .join(', ');
}
