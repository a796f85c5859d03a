import type { EntityManager } from '@mikro-orm/sqlite';
import { when, whereAll } from '../../db/sql-conditions.ts';

interface Out {
  lot_id: number;
  tag: string;
  leather_name: string;
  service: string;
  supplier_name: string;
  number: string;
  /** Thousandths of mm². */
  quantity: number;
  /** What it had cost when it went. */
  value: number;
}

/** Leather that was out to be worked on at the end of a day, line by line of the orders; as the ledger counts. */
export async function readOutAt(
  em: EntityManager,
  { on, leatherId }: { on: string; leatherId?: number | undefined },
): Promise<Out[]> {
  const { where, values } = whereAll([
    { sql: 'm.purchase_line_id IS NOT NULL AND m.day <= ?', values: [on] },
    ...when(leatherId, 'lot.leather_id = ?'),
    {
      sql: `NOT EXISTS (SELECT 1 FROM receipt_line r JOIN stock_movement back ON back.lot_id = r.lot_id
        WHERE r.purchase_line_id = m.purchase_line_id AND back.kind = 'receive' AND back.day <= ?)`,
      values: [on],
    },
  ]);
  return em.execute<Out[]>(
    `SELECT lot.id AS lot_id, lot.tag, leather.name AS leather_name, l.service, s.name AS supplier_name, p.number,
       -SUM(m.quantity) AS quantity, -SUM(m.value) AS value
     FROM stock_movement m JOIN lot ON lot.id = m.lot_id JOIN leather ON leather.id = lot.leather_id
       JOIN purchase_line l ON l.id = m.purchase_line_id JOIN purchase_order p ON p.id = l.purchase_order_id
       JOIN supplier s ON s.id = p.supplier_id
     ${where} GROUP BY m.purchase_line_id, lot.id HAVING SUM(m.quantity) <> 0 ORDER BY p.id, l.position`,
    values,
  );
}
