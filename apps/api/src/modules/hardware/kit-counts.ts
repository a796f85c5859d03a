import { wholeKits } from '@hidewright/domain';
import type { EntityManager } from '@mikro-orm/sqlite';
import { unscaled } from '../../db/columns/scaled-decimal.ts';
import { priceText } from '../../http/decimal-text.ts';

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

/** A kit in use. */
export interface Kit {
  id: number;
  name: string;
  parts: PartStock[];
}

interface Row {
  kit_id: number;
  kit_name: string;
  hardware_id: number;
  name: string;
  quantity: number;
  unit_price: number;
  on_hand: number;
  free: number;
  on_order: number;
}

const partsSql = (which: string) => `
  SELECT k.kit_id, kit.name AS kit_name, k.hardware_id, h.name, k.quantity, h.unit_price,
    COALESCE(b.on_hand, 0) AS on_hand, COALESCE(MAX(0, b.on_hand - b.reserved), 0) AS free,
    COALESCE((SELECT SUM(l.quantity - l.received) FROM purchase_line l JOIN purchase_order p ON p.id = l.purchase_order_id
      WHERE l.hardware_id = h.id AND l.received < l.quantity AND l.closed = 0 AND p.state IN ('sent', 'part received')), 0) AS on_order
  FROM kit_part k JOIN hardware kit ON kit.id = k.kit_id JOIN hardware h ON h.id = k.hardware_id
    LEFT JOIN stock_balance b ON b.hardware_id = h.id
  WHERE ${which} ORDER BY k.id`;

/** The parts of the kits among these. */
export async function partStock(em: EntityManager, ids: readonly number[]): Promise<PartStock[]> {
  const among = partsSql('k.kit_id IN (SELECT value FROM json_each(?))');
  return (await em.execute<Row[]>(among, [JSON.stringify(ids)])).map(toPartStock);
}

/** The kits that the shop still uses, with their parts, by name; in one question whatever the number. */
export async function readKits(em: EntityManager): Promise<Kit[]> {
  const rows = await em.execute<Row[]>(partsSql('kit.active = 1'));
  const kits = new Map<number, Kit>();
  for (const row of rows) {
    const kit = kits.get(row.kit_id) ?? { id: row.kit_id, name: row.kit_name, parts: [] };
    kits.set(kit.id, { ...kit, parts: [...kit.parts, toPartStock(row)] });
  }
  return [...kits.values()].sort((a, b) => a.name.localeCompare(b.name, 'en'));
}

function toPartStock(row: Row): PartStock {
  return {
    kitId: row.kit_id,
    hardwareId: row.hardware_id,
    name: row.name,
    quantity: row.quantity,
    unitPrice: priceText(unscaled(row.unit_price, 4)),
    onHand: row.on_hand,
    free: row.free,
    onOrder: row.on_order,
  };
}

/** The whole kits that parts make up; what is on order counts those that it will make possible. */
export function kitCounts(parts: readonly PartStock[]) {
  const fewest = (of: (part: PartStock) => number) =>
    wholeKits(parts.map((part) => ({ quantity: part.quantity, there: of(part) })));
  const [onHand, free] = [fewest((part) => part.onHand), fewest((part) => part.free)];
  const onOrder = fewest((part) => part.free + part.onOrder) - free;
  return { onHand, free, reserved: onHand - free, onOrder };
}
