import type { HardwareUnit } from '@hidewright/domain';
import type { EntityManager } from '@mikro-orm/sqlite';

/** A thing that the shop buys, as its table and the ledger keep it: thousandths of mm², or pieces. */
export interface ItemRow {
  of: 'leather' | 'hardware';
  id: number;
  name: string;
  kind: 'leather' | 'hardware' | 'supplies';
  /** What it is counted in: mm² of leather, else what one of it is. */
  unit: HardwareUnit | 'mm2';
  price: number;
  pack_size: number;
  supplier_id: number | null;
  minimum: number;
  order_point: number | null;
  order_quantity: number | null;
  whole_form: string | null;
  whole_area: number | null;
  on_hand: number;
  reserved: number;
  free: number;
  version: number;
}

const leathers = `
  SELECT 'leather' AS "of", l.id, l.name, 'leather' AS kind, 'mm2' AS unit, l.price_per_ft2 AS price,
    1 AS pack_size, l.supplier_id, COALESCE(l.reorder_at_mm2, 0) AS minimum,
    l.order_point_mm2 AS order_point, l.order_quantity_mm2 AS order_quantity,
    l.whole_form, l.whole_area_mm2 AS whole_area,
    COALESCE(SUM(b.on_hand), 0) AS on_hand, COALESCE(SUM(b.reserved), 0) AS reserved,
    COALESCE(SUM(MAX(0, b.on_hand - b.reserved)), 0) AS free, l.version
  FROM leather l LEFT JOIN lot ON lot.leather_id = l.id LEFT JOIN stock_balance b ON b.lot_id = lot.id
  WHERE l.active = 1 GROUP BY l.id ORDER BY l.name`;

/** Nobody buys kits, or what customers bring. */
const hardware = `
  SELECT 'hardware' AS "of", h.id, h.name, h.kind, h.unit, h.unit_price AS price,
    h.pack_size, h.supplier_id, h.reorder_at AS minimum, h.order_point, h.order_quantity,
    NULL AS whole_form, NULL AS whole_area,
    COALESCE(b.on_hand, 0) AS on_hand, COALESCE(b.reserved, 0) AS reserved,
    MAX(0, COALESCE(b.on_hand - b.reserved, 0)) AS free, h.version
  FROM hardware h LEFT JOIN stock_balance b ON b.hardware_id = h.id
  WHERE h.active = 1 AND h.from_customer = 0
    AND NOT EXISTS (SELECT 1 FROM kit_part k WHERE k.kit_id = h.id)
  ORDER BY h.name`;

/** All that is bought and still wanted, with what is there of it. */
export async function readOrderedItems(em: EntityManager): Promise<ItemRow[]> {
  return [...(await em.execute<ItemRow[]>(leathers)), ...(await em.execute<ItemRow[]>(hardware))];
}
