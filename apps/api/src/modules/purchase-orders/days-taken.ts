import type { EntityManager } from '@mikro-orm/sqlite';

const sql = `
  SELECT p.supplier_id, CAST(julianday(MIN(r.received_on)) - julianday(substr(p.sent_at, 1, 10)) AS INTEGER) AS days
  FROM purchase_order p JOIN receipt r ON r.purchase_order_id = p.id
  WHERE p.sent_at IS NOT NULL AND r.received_on > date(?, '-1 year') GROUP BY p.id
  HAVING days >= 0`;

/** How many days each supplier took, from sending an order to its first delivery; those of the last year. */
export async function readDaysTaken(
  em: EntityManager,
  today: string,
): Promise<(supplierId: number) => number[]> {
  const rows = await em.execute<{ supplier_id: number; days: number }[]>(sql, [today]);
  return (id) => rows.flatMap((row) => (row.supplier_id === id ? [row.days] : []));
}
