import { daysBetween } from '@hidewright/domain';
import type { EntityManager } from '@mikro-orm/sqlite';
import { dayIn } from '../../day-in.ts';

interface Row {
  supplier_id: number;
  sent_at: string;
  came_on: string;
  zone: string;
}

const sql = `
  SELECT p.supplier_id, p.sent_at, MIN(r.received_on) AS came_on,
    (SELECT time_zone FROM workshop WHERE id = 1) AS zone
  FROM purchase_order p JOIN receipt r ON r.purchase_order_id = p.id
  WHERE p.sent_at > date(?, '-1 year') GROUP BY p.id`;

/**
 * How many of the shop's days each supplier took, from sending an order to its first delivery; of the orders that were
 * sent in the last year. What came before its order was sent tells nothing.
 */
export async function readDaysTaken(
  em: EntityManager,
  today: string,
): Promise<(supplierId: number) => number[]> {
  const took = new Map<number, number[]>();
  for (const row of await em.execute<Row[]>(sql, [today])) {
    const days = daysBetween(dayIn(row.zone, new Date(row.sent_at)), row.came_on);
    if (days >= 0) took.set(row.supplier_id, [...(took.get(row.supplier_id) ?? []), days]);
  }
  return (id) => took.get(id) ?? [];
}
