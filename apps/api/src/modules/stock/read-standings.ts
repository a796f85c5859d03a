import type { EntityManager } from '@mikro-orm/sqlite';
import { standingsOf, type Standings } from './standings.ts';

const onOrder = (column: string, id: string) => `COALESCE((
  SELECT SUM(l.quantity - l.received) FROM purchase_line l JOIN purchase_order p ON p.id = l.purchase_order_id
  WHERE l.${column} = ${id} AND l.received < l.quantity AND l.closed = 0 AND p.state IN ('sent', 'part received')), 0)`;

/** What open jobs need by their estimate, beyond what they hold and have taken. */
const promisedHardware = `COALESCE((
  SELECT SUM(MAX(0, needed - held - taken)) FROM (
    SELECT needed,
      COALESCE((SELECT SUM(r.open) FROM reservation r
        WHERE r.job_id = need.job_id AND r.hardware_id = h.id), 0) AS held,
      COALESCE((SELECT -SUM(m.quantity) FROM stock_movement m
        WHERE m.job_id = need.job_id AND m.hardware_id = h.id), 0) AS taken
    FROM need WHERE need.hardware_id = h.id)), 0)`;

/** What the open jobs need, read out of their estimates once. */
const needs = `WITH need AS MATERIALIZED (
  SELECT job.id AS job_id, json_extract(part.value, '$.hardwareId') AS hardware_id,
    SUM(json_extract(part.value, '$.quantity')) AS needed
  FROM job, json_each(job.estimate, '$.hardware') part WHERE job.state <> 'finished' GROUP BY 1, 2)`;

const promisedLeather = `COALESCE((
  SELECT SUM(MAX(0, needed - held - taken)) FROM (
    SELECT CAST(ROUND(json_extract(job.estimate, '$.leatherAreaMm2') * 1000) AS INTEGER) AS needed,
      COALESCE((SELECT SUM(r.open) FROM reservation r JOIN lot ON lot.id = r.lot_id
        WHERE r.job_id = job.id AND lot.leather_id = leather.id), 0) AS held,
      COALESCE((SELECT -SUM(m.quantity) FROM stock_movement m JOIN lot ON lot.id = m.lot_id
        WHERE m.job_id = job.id AND lot.leather_id = leather.id), 0) AS taken
    FROM job WHERE job.state <> 'finished' AND json_extract(job.estimate, '$.leatherId') = leather.id)), 0)`;

const hardwareSql = `${needs} SELECT h.id, COALESCE(b.reserved, 0) AS reserved,
    MAX(0, COALESCE(b.on_hand - b.reserved, 0)) AS free,
    ${onOrder('hardware_id', 'h.id')} AS on_order, ${promisedHardware} AS promised
  FROM hardware h LEFT JOIN stock_balance b ON b.hardware_id = h.id`;

const leatherSql = `SELECT leather.id,
    COALESCE((SELECT SUM(b.reserved) FROM lot JOIN stock_balance b ON b.lot_id = lot.id
      WHERE lot.leather_id = leather.id), 0) AS reserved,
    COALESCE((SELECT SUM(MAX(0, b.on_hand - b.reserved)) FROM lot JOIN stock_balance b ON b.lot_id = lot.id
      WHERE lot.leather_id = leather.id), 0) AS free,
    ${onOrder('leather_id', 'leather.id')} AS on_order, ${promisedLeather} AS promised
  FROM leather`;

/** How everything stands now. */
export async function readStandings(em: EntityManager): Promise<Standings> {
  return standingsOf(await em.execute(hardwareSql), await em.execute(leatherSql));
}
