import { kitPrice } from '@hidewright/domain';
import { Decimal } from 'decimal.js';
import type { EntityManager } from '@mikro-orm/sqlite';
import type { Hardware as HardwareReply } from '@hidewright/contract';
import { unscaled } from '../../db/columns/scaled-decimal.ts';
import { when, whereAll } from '../../db/sql-conditions.ts';
import { moneyText, priceText } from '../../http/decimal-text.ts';
import { notFound } from '../../http/problem.ts';
import { kitCounts } from './kit-counts.ts';
import { readRelated, type Related } from './related-hardware.ts';

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
  unit: HardwareReply['unit'];
  metal: string;
  colour: string;
  bin: string;
  from_customer: number;
  price_from_parts: number;
  post_length_mm: number | null;
  stack_min_mm: number | null;
  stack_max_mm: number | null;
  setting_die: string;
  setting_die_here: number;
  active: number;
  on_hand: number;
  reserved: number;
  on_order: number;
  value: number;
  short: number;
  version: number;
}

const counted = `
  SELECT h.*, s.name AS supplier_name,
    COALESCE(b.on_hand, 0) AS on_hand,
    COALESCE(b.reserved, 0) AS reserved,
    COALESCE((SELECT SUM(l.quantity - l.received) FROM purchase_line l JOIN purchase_order p ON p.id = l.purchase_order_id
      WHERE l.hardware_id = h.id AND l.received < l.quantity AND l.closed = 0 AND p.state IN ('sent', 'part received')), 0) AS on_order,
    COALESCE((SELECT SUM(m.value) FROM stock_movement m WHERE m.hardware_id = h.id), 0) AS value
  FROM hardware h
  LEFT JOIN supplier s ON s.id = h.supplier_id
  LEFT JOIN stock_balance b ON b.hardware_id = h.id`;

/** Below the owner's mark although what is ordered is counted in; nobody buys kits or what customers bring. */
const isShort = `(MAX(0, on_hand - reserved) + on_order < reorder_at AND from_customer = 0
  AND NOT EXISTS (SELECT 1 FROM kit_part k WHERE k.kit_id = c.id))`;

/** Hardware with its counts, newest first. */
export async function readHardwareList(em: EntityManager, asked: Asked): Promise<HardwareReply[]> {
  const { where, values } = whereAll([
    ...when(asked.id, 'id = ?'),
    ...when(asked.below, 'id < ?'),
    ...when(asked.kind, 'kind = ?'),
    ...when(asked.q, 'name LIKE ?', (q) => [`%${q}%`]),
    ...when(asked.short, `${isShort} = ?`, (short) => [short === 'yes' ? 1 : 0]),
  ]);
  const sql = `SELECT *, ${isShort} AS short FROM (${counted}) c ${where} ORDER BY id DESC LIMIT ?`;
  const rows = await em.execute<Row[]>(sql, [...values, asked.limit ?? 1]);
  const related = await readRelated(
    em,
    rows.map(({ id }) => id),
  );
  return rows.map((row) => toReply(row, related));
}

/** @throws {Problem} 404 */
export async function readOneHardware(em: EntityManager, id: number): Promise<HardwareReply> {
  const [found] = await readHardwareList(em, { id });
  if (found === undefined) throw notFound('hardware');
  return found;
}

function toReply(row: Row, related: Related): HardwareReply {
  const parts = related.partsOf(row.id);
  const isKit = parts.length > 0;
  const own = unscaled(row.unit_price, 4);
  const price = isKit && row.price_from_parts === 1 ? new Decimal(kitPrice(parts)) : own;
  return {
    id: row.id,
    name: row.name,
    kind: row.kind,
    unitPrice: priceText(price),
    packSize: row.pack_size,
    reorderAt: row.reorder_at,
    supplierId: row.supplier_id,
    supplierName: row.supplier_name,
    ...detailsOf(row),
    ...related.repliesFor(row.id),
    active: row.active === 1,
    ...(isKit ? kitCounts(parts) : ownCounts(row)),
    short: row.short === 1,
    valueOnHand: moneyText(unscaled(row.value, 2)),
    version: row.version,
  };
}

function ownCounts({ on_hand: onHand, reserved, on_order: onOrder }: Row) {
  return { onHand, reserved, free: Math.max(0, onHand - reserved), onOrder };
}

function detailsOf(row: Row) {
  const lengthText = (kept: number | null) => (kept === null ? null : unscaled(kept, 6).toFixed());
  return {
    unit: row.unit,
    metal: row.metal,
    colour: row.colour,
    bin: row.bin,
    fromCustomer: row.from_customer === 1,
    priceFromParts: row.price_from_parts === 1,
    postLengthMm: lengthText(row.post_length_mm),
    stackMinMm: lengthText(row.stack_min_mm),
    stackMaxMm: lengthText(row.stack_max_mm),
    settingDie: row.setting_die,
    settingDieHere: row.setting_die_here === 1,
  };
}
