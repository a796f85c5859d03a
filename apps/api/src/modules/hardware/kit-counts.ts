import { priceText } from '../../http/decimal-text.ts';
import type { EntityManager } from '@mikro-orm/sqlite';
import { unscaled } from '../../db/columns/scaled-decimal.ts';

/** A part of a kit with what there is of it. */
export interface PartStock {
  kitId: number;
  hardwareId: number;
  name: string;
  quantity: number;
  unitPrice: string;
  onHand: number;
  free: number;
  onOrder: number;
}

interface Row {
  kit_id: number;
  hardware_id: number;
  name: string;
  quantity: number;
  unit_price: number;
  on_hand: number;
  free: number;
  on_order: number;
}

const partsSql = `
  SELECT k.kit_id, k.hardware_id, h.name, k.quantity, h.unit_price,
    COALESCE(b.on_hand, 0) AS on_hand, COALESCE(MAX(0, b.on_hand - b.reserved), 0) AS free,
    COALESCE((SELECT SUM(l.quantity - l.received) FROM purchase_line l JOIN purchase_order p ON p.id = l.purchase_order_id
      WHERE l.hardware_id = h.id AND l.received < l.quantity AND l.closed = 0 AND p.state IN ('sent', 'part received')), 0) AS on_order
  FROM kit_part k JOIN hardware h ON h.id = k.hardware_id LEFT JOIN stock_balance b ON b.hardware_id = h.id
  WHERE k.kit_id IN (SELECT value FROM json_each(?)) ORDER BY k.id`;

/** The parts of the kits among these. */
export async function partStock(em: EntityManager, ids: readonly number[]): Promise<PartStock[]> {
  const rows = await em.execute<Row[]>(partsSql, [JSON.stringify(ids)]);
  return rows.map((row) => ({
    kitId: row.kit_id,
    hardwareId: row.hardware_id,
    name: row.name,
    quantity: row.quantity,
    unitPrice: priceText(unscaled(row.unit_price, 4)),
    onHand: row.on_hand,
    free: row.free,
    onOrder: row.on_order,
  }));
}

/** The whole kits that parts make up; what is on order counts those that it will make possible. */
export function kitCounts(parts: readonly PartStock[]) {
  const fewest = (of: (part: PartStock) => number) =>
    Math.min(...parts.map((part) => Math.floor(of(part) / part.quantity)));
  const [onHand, free] = [fewest((part) => part.onHand), fewest((part) => part.free)];
  const onOrder = fewest((part) => part.free + part.onOrder) - free;
  return { onHand, free, reserved: onHand - free, onOrder };
}
