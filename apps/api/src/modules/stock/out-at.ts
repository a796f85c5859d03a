import type { EntityManager } from '@mikro-orm/sqlite';
import { when, whereAll } from '../../db/sql-conditions.ts';

interface Out {
  quantity: number;
  value: number;
}

/** Leather that was out to be worked on at the end of a day, and what it had cost when it went; as the ledger counts. */
export async function readOutAt(
  em: EntityManager,
  { on, leatherId }: { on: string; leatherId?: number | undefined },
): Promise<Out> {
  const { where, values } = whereAll([
    { sql: 'm.purchase_line_id IS NOT NULL AND m.day <= ?', values: [on] },
    ...when(leatherId, 'lot.leather_id = ?'),
    {
      sql: `NOT EXISTS (SELECT 1 FROM receipt_line r JOIN stock_movement back ON back.lot_id = r.lot_id
        WHERE r.purchase_line_id = m.purchase_line_id AND back.kind = 'receive' AND back.day <= ?)`,
      values: [on],
    },
  ]);
  const [row] = await em.execute<[Out]>(
    `SELECT COALESCE(-SUM(m.quantity), 0) AS quantity, COALESCE(-SUM(m.value), 0) AS value
     FROM stock_movement m JOIN lot ON lot.id = m.lot_id ${where}`,
    values,
  );
  return row;
}
