import type { EntityManager } from '@mikro-orm/sqlite';
import { standingsOf, type Standings } from './standings.ts';

interface At {
  /** The day whose end is meant. */
  on: string;
  /** The instant at which it was over in the shop. */
  over: string;
}

/** Everything that was there, held, taken and needed at the end of the day; the day and its end by name. */
const then = `WITH
  asked (day, over) AS (SELECT ?, ?),
  there AS (SELECT lot_id, hardware_id, SUM(quantity) AS quantity FROM stock_movement, asked
    WHERE stock_movement.day <= asked.day GROUP BY lot_id, hardware_id),
  held AS (SELECT r.job_id, r.lot_id, r.hardware_id, SUM(m.quantity) AS quantity
    FROM asked, reservation_movement m JOIN reservation r ON r.id = m.reservation_id
    WHERE m.day <= asked.day GROUP BY r.job_id, r.lot_id, r.hardware_id),
  taken AS (SELECT job_id, lot_id, hardware_id, -SUM(quantity) AS quantity FROM stock_movement, asked
    WHERE job_id IS NOT NULL AND stock_movement.day <= asked.day GROUP BY job_id, lot_id, hardware_id),
  open_job AS (SELECT j.id, j.estimate FROM asked, job j JOIN customer_order o ON o.id = j.order_id
    WHERE o.taken_on_at < asked.over AND (j.finished_at IS NULL OR j.finished_at >= asked.over)),
  came AS (SELECT l.purchase_line_id AS id, SUM(l.quantity) AS quantity
    FROM asked, receipt_line l JOIN receipt t ON t.id = l.receipt_id
    WHERE t.received_on <= asked.day AND l.purchase_line_id IS NOT NULL GROUP BY l.purchase_line_id),
  awaited AS (SELECT l.leather_id, l.hardware_id, SUM(MAX(0, l.quantity - COALESCE(came.quantity, 0))) AS quantity
    FROM asked, purchase_line l JOIN purchase_order p ON p.id = l.purchase_order_id LEFT JOIN came ON came.id = l.id
    WHERE p.sent_at < asked.over AND (l.awaited_until IS NULL OR l.awaited_until > asked.day)
    GROUP BY l.leather_id, l.hardware_id)`;

const hardwareSql = `${then},
  need AS (SELECT open_job.id AS job_id, json_extract(part.value, '$.hardwareId') AS hardware_id,
      SUM(json_extract(part.value, '$.quantity')) AS quantity
    FROM open_job, json_each(open_job.estimate, '$.hardware') part GROUP BY 1, 2),
  promised AS (SELECT need.hardware_id,
      SUM(MAX(0, need.quantity - COALESCE(held.quantity, 0) - COALESCE(taken.quantity, 0))) AS quantity
    FROM need
      LEFT JOIN held ON held.job_id = need.job_id AND held.hardware_id = need.hardware_id
      LEFT JOIN taken ON taken.job_id = need.job_id AND taken.hardware_id = need.hardware_id
    GROUP BY need.hardware_id),
  kept AS (SELECT hardware_id, SUM(quantity) AS quantity FROM held WHERE hardware_id IS NOT NULL GROUP BY hardware_id)
  SELECT h.id, COALESCE(kept.quantity, 0) AS reserved,
    MAX(0, COALESCE(there.quantity, 0) - COALESCE(kept.quantity, 0)) AS free,
    COALESCE(awaited.quantity, 0) AS on_order, COALESCE(promised.quantity, 0) AS promised
  FROM hardware h
    LEFT JOIN there ON there.hardware_id = h.id
    LEFT JOIN kept ON kept.hardware_id = h.id
    LEFT JOIN awaited ON awaited.hardware_id = h.id
    LEFT JOIN promised ON promised.hardware_id = h.id`;

const leatherSql = `${then},
  need AS (SELECT open_job.id AS job_id, json_extract(open_job.estimate, '$.leatherId') AS leather_id,
      CAST(ROUND(json_extract(open_job.estimate, '$.leatherAreaMm2') * 1000) AS INTEGER) AS quantity FROM open_job),
  of_job AS (SELECT each.job_id, lot.leather_id, SUM(each.quantity) AS quantity
    FROM (SELECT * FROM held UNION ALL SELECT * FROM taken) each JOIN lot ON lot.id = each.lot_id
    GROUP BY each.job_id, lot.leather_id),
  promised AS (SELECT need.leather_id, SUM(MAX(0, need.quantity - COALESCE(of_job.quantity, 0))) AS quantity
    FROM need LEFT JOIN of_job ON of_job.job_id = need.job_id AND of_job.leather_id = need.leather_id
    GROUP BY need.leather_id),
  kept AS (SELECT lot_id, SUM(quantity) AS quantity FROM held WHERE lot_id IS NOT NULL GROUP BY lot_id),
  hung AS (SELECT lot.leather_id, SUM(COALESCE(kept.quantity, 0)) AS reserved,
      SUM(MAX(0, there.quantity - COALESCE(kept.quantity, 0))) AS free
    FROM there JOIN lot ON lot.id = there.lot_id LEFT JOIN kept ON kept.lot_id = lot.id GROUP BY lot.leather_id)
  SELECT leather.id, COALESCE(hung.reserved, 0) AS reserved, COALESCE(hung.free, 0) AS free,
    COALESCE(awaited.quantity, 0) AS on_order, COALESCE(promised.quantity, 0) AS promised
  FROM leather
    LEFT JOIN hung ON hung.leather_id = leather.id
    LEFT JOIN awaited ON awaited.leather_id = leather.id
    LEFT JOIN promised ON promised.leather_id = leather.id`;

/** How everything stood at the end of a day, read off the rows that say what moved, was held and came until then. */
export async function readStandingsAt(em: EntityManager, { on, over }: At): Promise<Standings> {
  return standingsOf(
    await em.execute(hardwareSql, [on, over]),
    await em.execute(leatherSql, [on, over]),
  );
}
