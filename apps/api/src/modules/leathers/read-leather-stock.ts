import type { EntityManager } from '@mikro-orm/sqlite';
import type { Leather as LeatherReply } from '@hidewright/contract';
import { unscaled } from '../../db/columns/scaled-decimal.ts';
import { Supplier } from '../suppliers/supplier.entity.ts';
import type { Leather } from './leather.entity.ts';

type Areas = Pick<LeatherReply, 'onHandAreaMm2' | 'freeAreaMm2' | 'onOrderAreaMm2'>;

/** What a list of leathers shows beside the leathers themselves. */
export interface LeatherStock {
  supplierNames: Map<number, string>;
  areasOf(id: number): Areas;
}

interface Row {
  id: number;
  on_hand: number;
  free: number;
  on_order: number;
}

const areas = `
  SELECT leather.id,
    COALESCE((SELECT SUM(b.on_hand) FROM lot JOIN stock_balance b ON b.lot_id = lot.id
      WHERE lot.leather_id = leather.id), 0) AS on_hand,
    COALESCE((SELECT SUM(MAX(0, b.on_hand - b.reserved)) FROM lot JOIN stock_balance b ON b.lot_id = lot.id
      WHERE lot.leather_id = leather.id), 0) AS free,
    COALESCE((SELECT SUM(l.quantity - l.received) FROM purchase_line l JOIN purchase_order p ON p.id = l.purchase_order_id
      WHERE l.leather_id = leather.id AND l.received < l.quantity AND l.closed = 0 AND p.state IN ('sent', 'part received')), 0) AS on_order
  FROM leather WHERE leather.id IN (SELECT value FROM json_each(?))`;

/** Who sells each leather, and how much of it is on the rack and on its way. */
export async function readLeatherStock(
  em: EntityManager,
  leathers: Leather[],
): Promise<LeatherStock> {
  const rows = await em.execute<Row[]>(areas, [JSON.stringify(leathers.map(({ id }) => id))]);
  const suppliers = await em.find(Supplier, {
    id: leathers.flatMap(({ supplierId }) => supplierId ?? []),
  });
  const byLeather = new Map(rows.map((row) => [row.id, row]));
  return {
    supplierNames: new Map(suppliers.map(({ id, name }) => [id, name])),
    areasOf: (id) => toAreas(byLeather.get(id)),
  };
}

function toAreas(row: Row | undefined): Areas {
  const text = (thousandths: number | undefined) => unscaled(thousandths ?? 0, 3).toFixed();
  return {
    onHandAreaMm2: text(row?.on_hand),
    freeAreaMm2: text(row?.free),
    onOrderAreaMm2: text(row?.on_order),
  };
}
