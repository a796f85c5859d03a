import { arrivalDay, leadTime } from '@hidewright/domain';
import type { Work } from '../../work.ts';
import { readDaysTaken } from './days-taken.ts';
import type { PurchaseOrder } from './purchase-order.entity.ts';

interface Row {
  id: number;
  supplier_id: number;
  days: number;
}

/** What its own supplier says of the slowest line: for that thing, or else usually, as for all work. */
const sql = `
  SELECT p.id, p.supplier_id, MAX(COALESCE(o.lead_days, s.lead_days)) AS days
  FROM purchase_order p JOIN supplier s ON s.id = p.supplier_id
  JOIN purchase_line l ON l.purchase_order_id = p.id
  LEFT JOIN supplier_offer o ON o.supplier_id = p.supplier_id AND l.service IS NULL
    AND (o.leather_id = l.leather_id OR o.hardware_id = l.hardware_id)
  WHERE p.id IN (SELECT value FROM json_each(?)) GROUP BY p.id`;

/**
 * The day on which each draft would be here if it were sent today: the one that was chosen for it, or else, or where
 * that is over, as what to order has it, when its slowest line comes. Nothing is told of what has been sent.
 */
export async function readDraftArrivals(
  { em, today }: Pick<Work, 'em' | 'today'>,
  orders: readonly PurchaseOrder[],
): Promise<Map<number, string>> {
  const drafts = orders.filter(({ state }) => state === 'draft');
  if (drafts.length === 0) return new Map();
  const chosen = new Map(drafts.map(({ id, expectedOn }) => [id, expectedOn ?? '']));
  const rows = await em.execute<Row[]>(sql, [JSON.stringify([...chosen.keys()])]);
  const daysTaken = await readDaysTaken(em, today);
  return new Map(
    rows.map(({ id, supplier_id: supplierId, days }) => {
      const own = chosen.get(id) ?? '';
      return [id, own < today ? arrivalDay(today, leadTime(days, daysTaken(supplierId))) : own];
    }),
  );
}
