import type { EntityManager } from '@mikro-orm/sqlite';
import { standingsOf, type Promised, type Standings } from './standings.ts';

const onOrder = (column: string, id: string) => `COALESCE((
  SELECT SUM(l.quantity - l.received) FROM purchase_line l JOIN purchase_order p ON p.id = l.purchase_order_id
  WHERE l.${column} = ${id} AND l.received < l.quantity AND l.closed = 0 AND p.state IN ('sent', 'part received')), 0)`;

const hardwareSql = `SELECT h.id, COALESCE(b.reserved, 0) AS reserved,
    MAX(0, COALESCE(b.on_hand - b.reserved, 0)) AS free,
    ${onOrder('hardware_id', 'h.id')} AS on_order
  FROM hardware h LEFT JOIN stock_balance b ON b.hardware_id = h.id`;

const leatherSql = `SELECT leather.id,
    COALESCE((SELECT SUM(b.reserved) FROM lot JOIN stock_balance b ON b.lot_id = lot.id
      WHERE lot.leather_id = leather.id), 0) AS reserved,
    COALESCE((SELECT SUM(MAX(0, b.on_hand - b.reserved)) FROM lot JOIN stock_balance b ON b.lot_id = lot.id
      WHERE lot.leather_id = leather.id), 0) AS free,
    ${onOrder('leather_id', 'leather.id')} AS on_order
  FROM leather`;

/** How everything stands now. */
export async function readStandings(em: EntityManager, promised: Promised): Promise<Standings> {
  return standingsOf(await em.execute(hardwareSql), await em.execute(leatherSql), promised);
}
