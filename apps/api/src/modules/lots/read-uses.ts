import type { WentInto } from '@hidewright/contract';
import type { EntityManager } from '@mikro-orm/sqlite';
import { unscaled } from '../../db/columns/scaled-decimal.ts';
import { when, whereAll } from '../../db/sql-conditions.ts';

interface UseRow {
  lot_id: number;
  tag: string;
  job_id: number;
  job_number: string;
  job_state: WentInto['jobState'];
  order_id: number;
  order_number: string;
  title: string;
  customer_name: string;
  area: number;
  good: number;
}

/** What jobs took of these lots, or for an order, less what came back whole or as an offcut; newest job first. */
export async function readUses(
  em: EntityManager,
  asked: { lotIds?: readonly number[]; orderId?: number },
): Promise<WentInto[]> {
  const { where, values } = whereAll([
    { sql: 'm.lot_id IS NOT NULL AND m.job_id IS NOT NULL', values: [] },
    ...when(
      asked.lotIds && JSON.stringify(asked.lotIds),
      'lot.id IN (SELECT value FROM json_each(?))',
    ),
    ...when(asked.orderId, 'o.id = ?'),
  ]);
  const rows = await em.execute<UseRow[]>(
    `SELECT lot.id AS lot_id, lot.tag, j.id AS job_id, j.number AS job_number, j.state AS job_state, j.good,
       o.id AS order_id, o.number AS order_number, o.title, c.name AS customer_name, -SUM(m.quantity) AS area
     FROM stock_movement m
     JOIN lot ON lot.id = COALESCE(m.from_lot_id, m.lot_id)
     JOIN job j ON j.id = m.job_id
     JOIN customer_order o ON o.id = j.order_id
     JOIN customer c ON c.id = o.customer_id
     ${where} GROUP BY lot.id, j.id HAVING SUM(m.quantity) < 0 ORDER BY j.id DESC, lot.id`,
    values,
  );
  return rows.map((row) => ({
    lotId: row.lot_id,
    tag: row.tag,
    jobId: row.job_id,
    jobNumber: row.job_number,
    jobState: row.job_state,
    orderId: row.order_id,
    orderNumber: row.order_number,
    title: row.title,
    customerName: row.customer_name,
    areaMm2: unscaled(row.area, 3).toFixed(),
    good: row.job_state === 'finished' ? row.good : null,
  }));
}
