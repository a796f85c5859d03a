import type { EntityManager } from '@mikro-orm/sqlite';
import type { DayOver } from '../../day-in.ts';
import { standingsOf, type Promised, type Standings } from './standings.ts';

/**
 * Everything that was there, held and awaited at the end of the day. A delivery that was written down on a later day than
 * it came was awaited until then, as the ledger has it on the rack from then.
 */
const then = `WITH
  asked (day, over) AS (SELECT ?, ?),
  there AS (SELECT lot_id, hardware_id, SUM(quantity) AS quantity FROM stock_movement, asked
    WHERE stock_movement.day <= asked.day GROUP BY lot_id, hardware_id),
  held AS (SELECT r.lot_id, r.hardware_id, SUM(m.quantity) AS quantity
    FROM asked, reservation_movement m JOIN reservation r ON r.id = m.reservation_id
    WHERE m.day <= asked.day GROUP BY r.lot_id, r.hardware_id),
  came AS (SELECT l.purchase_line_id AS id, SUM(COALESCE(l.marked_area_mm2, l.quantity)) AS quantity
    FROM asked, receipt_line l JOIN receipt t ON t.id = l.receipt_id
    WHERE t.at < asked.over AND l.purchase_line_id IS NOT NULL GROUP BY l.purchase_line_id),
  awaited AS (SELECT l.leather_id, l.hardware_id, SUM(MAX(0, l.quantity - COALESCE(came.quantity, 0))) AS quantity
    FROM asked, purchase_line l JOIN purchase_order p ON p.id = l.purchase_order_id LEFT JOIN came ON came.id = l.id
    WHERE p.sent_at < asked.over AND (l.awaited_until IS NULL OR l.awaited_until > asked.day)
    GROUP BY l.leather_id, l.hardware_id)`;

const hardwareSql = `${then}
  SELECT h.id, COALESCE(held.quantity, 0) AS reserved,
    MAX(0, COALESCE(there.quantity, 0) - COALESCE(held.quantity, 0)) AS free,
    COALESCE(awaited.quantity, 0) AS on_order
  FROM hardware h
    LEFT JOIN there ON there.hardware_id = h.id
    LEFT JOIN held ON held.hardware_id = h.id
    LEFT JOIN awaited ON awaited.hardware_id = h.id`;

const leatherSql = `${then},
  hung AS (SELECT lot.leather_id, SUM(COALESCE(held.quantity, 0)) AS reserved,
      SUM(MAX(0, there.quantity - COALESCE(held.quantity, 0))) AS free
    FROM there JOIN lot ON lot.id = there.lot_id LEFT JOIN held ON held.lot_id = lot.id GROUP BY lot.leather_id)
  SELECT leather.id, COALESCE(hung.reserved, 0) AS reserved, COALESCE(hung.free, 0) AS free,
    COALESCE(awaited.quantity, 0) AS on_order
  FROM leather
    LEFT JOIN hung ON hung.leather_id = leather.id
    LEFT JOIN awaited ON awaited.leather_id = leather.id`;

/** How everything stood at the end of a day, read off the rows that say what moved, was held and came until then. */
export async function readStandingsAt(
  em: EntityManager,
  { on, over }: DayOver,
  promised: Promised,
): Promise<Standings> {
  return standingsOf(
    await em.execute(hardwareSql, [on, over]),
    await em.execute(leatherSql, [on, over]),
    promised,
  );
}
