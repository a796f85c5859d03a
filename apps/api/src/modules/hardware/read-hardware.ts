import type { EntityManager } from '@mikro-orm/sqlite';
import type { Hardware as HardwareReply } from '@hidewright/contract';
import { unscaled } from '../../db/columns/scaled-decimal.ts';
import { when, whereAll } from '../../db/sql-conditions.ts';
import { moneyText, priceText } from '../../http/decimal-text.ts';
import { notFound } from '../../http/problem.ts';

interface Asked {
  id?: number | undefined;
  below?: number | undefined;
  q?: string | undefined;
  kind?: string | undefined;
  short?: 'yes' | 'no' | undefined;
  limit?: number;
}

interface Row {
  id: number;
  name: string;
  kind: HardwareReply['kind'];
  unit_price: number;
  pack_size: number;
  reorder_at: number;
  supplier_id: number | null;
  supplier_name: string | null;
  active: number;
  on_hand: number;
  reserved: number;
  on_order: number;
  value: number;
  version: number;
}

const counted = `
  SELECT h.*, s.name AS supplier_name,
    COALESCE(b.on_hand, 0) AS on_hand,
    COALESCE(b.reserved, 0) AS reserved,
    COALESCE((SELECT SUM(l.quantity - l.received) FROM purchase_line l JOIN purchase_order p ON p.id = l.purchase_order_id
      WHERE l.hardware_id = h.id AND l.received < l.quantity AND p.state IN ('sent', 'part received')), 0) AS on_order,
    COALESCE((SELECT SUM(m.value) FROM stock_movement m WHERE m.hardware_id = h.id), 0) AS value
  FROM hardware h
  LEFT JOIN supplier s ON s.id = h.supplier_id
  LEFT JOIN stock_balance b ON b.hardware_id = h.id`;

/** Below the owner's mark although what is ordered is counted in. */
const isShort = '(MAX(0, on_hand - reserved) + on_order < reorder_at)';

/** Hardware with its counts, newest first. */
export async function readHardwareList(em: EntityManager, asked: Asked): Promise<HardwareReply[]> {
  const { where, values } = whereAll([
    ...when(asked.id, 'id = ?'),
    ...when(asked.below, 'id < ?'),
    ...when(asked.kind, 'kind = ?'),
    ...when(asked.q, 'name LIKE ?', (q) => [`%${q}%`]),
    ...when(asked.short, `${isShort} = ?`, (short) => [short === 'yes' ? 1 : 0]),
  ]);
  const sql = `SELECT * FROM (${counted}) ${where} ORDER BY id DESC LIMIT ?`;
  const rows = await em.execute<Row[]>(sql, [...values, asked.limit ?? 1]);
  return rows.map(toReply);
}

/** @throws {Problem} 404 */
export async function readOneHardware(em: EntityManager, id: number): Promise<HardwareReply> {
  const [found] = await readHardwareList(em, { id });
  if (found === undefined) throw notFound('hardware');
  return found;
}

function toReply(row: Row): HardwareReply {
  const free = Math.max(0, row.on_hand - row.reserved);
  return {
    id: row.id,
    name: row.name,
    kind: row.kind,
    unitPrice: priceText(unscaled(row.unit_price, 4)),
    packSize: row.pack_size,
    reorderAt: row.reorder_at,
    supplierId: row.supplier_id,
    supplierName: row.supplier_name,
    active: row.active === 1,
    onHand: row.on_hand,
    reserved: row.reserved,
    free,
    onOrder: row.on_order,
    short: free + row.on_order < row.reorder_at,
    valueOnHand: moneyText(unscaled(row.value, 2)),
    version: row.version,
  };
}
