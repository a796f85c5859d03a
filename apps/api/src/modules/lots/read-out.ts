import type { EntityManager } from '@mikro-orm/sqlite';
import type { OutFor } from '@hidewright/contract';
import { unscaled } from '../../db/columns/scaled-decimal.ts';

interface Row {
  lot_id: number;
  service: string;
  quantity: number;
  supplier: string;
  order_id: number;
  number: string;
  becomes: string;
  expected_on: string | null;
}

/** Lines that leather is out on: sent, and neither back nor closed. */
export const linesOut = `purchase_line l JOIN purchase_order p ON p.id = l.purchase_order_id
  AND p.state IN ('sent', 'part received') AND l.closed = 0 AND l.received = 0 AND l.service IS NOT NULL`;

/** What of some lots is out to be worked on, lot by lot. */
export async function readOut(
  em: EntityManager,
  lotIds: readonly number[],
): Promise<(lotId: number) => OutFor[]> {
  const rows = await em.execute<Row[]>(
    `SELECT l.from_lot_id AS lot_id, l.service, l.quantity, s.name AS supplier, p.id AS order_id, p.number,
       leather.name AS becomes, COALESCE(l.expected_on, p.expected_on) AS expected_on
     FROM ${linesOut} JOIN supplier s ON s.id = p.supplier_id JOIN leather ON leather.id = l.leather_id
     WHERE l.from_lot_id IN (SELECT value FROM json_each(?)) ORDER BY l.id`,
    [JSON.stringify(lotIds)],
  );
  return (lotId) => rows.filter((row) => row.lot_id === lotId).map(toOut);
}

const toOut = (row: Row): OutFor => ({
  service: row.service,
  areaMm2: unscaled(row.quantity, 3).toFixed(),
  supplierName: row.supplier,
  purchaseOrderId: row.order_id,
  purchaseOrderNumber: row.number,
  becomesName: row.becomes,
  expectedOn: row.expected_on,
});
