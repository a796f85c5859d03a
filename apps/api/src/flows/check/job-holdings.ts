import type { EntityManager } from '@mikro-orm/sqlite';
import type { DayOver } from '../../day-in.ts';

/** A job that is open, with what it needs by its estimate. */
export interface JobRow {
  id: number;
  number: string;
  title: string;
  promised_on: string;
  estimate: string;
}

/** What a job has of a leather or some hardware. */
export interface Holding {
  job_id: number;
  hardware_id: number | null;
  leather_id: number | null;
  held: number;
  /** Less what it brought back, but for offcuts: what was cut up does not have to be taken again. */
  taken: number;
}

/** More is held of it than is there, since an honest count found less. */
export interface BrokenRow {
  hardware_id: number | null;
  leather_id: number | null;
  missing: number;
  /** [job, what it holds of it] as JSON, the last promise first. */
  holders: string;
}

/** Now, or as it was at the end of a day. */
export interface Holdings {
  jobs: JobRow[];
  holdings: Holding[];
  broken: BrokenRow[];
}

const openNow = `SELECT j.id, j.number, o.title, o.promised_on, j.estimate
  FROM job j JOIN customer_order o ON o.id = j.order_id
  WHERE j.state <> 'finished' AND o.state <> 'cancelled' ORDER BY o.promised_on, j.id`;

const openThen = `SELECT j.id, j.number, o.title, o.promised_on, j.estimate
  FROM job j JOIN customer_order o ON o.id = j.order_id
  WHERE o.taken_on_at < :over AND (j.finished_at IS NULL OR j.finished_at >= :over)
    AND NOT EXISTS (SELECT 1 FROM order_cancellation c WHERE c.order_id = o.id AND c.at < :over)
  ORDER BY o.promised_on, j.id`;

const heldNow = `SELECT job_id, lot_id, hardware_id, open AS quantity FROM reservation WHERE open > 0`;
const heldThen = `SELECT r.job_id, r.lot_id, r.hardware_id, m.quantity
  FROM reservation_movement m JOIN reservation r ON r.id = m.reservation_id WHERE m.day <= :on`;

/** Of what some jobs hold and have taken, by leather and hardware. */
const holdingsOf = (held: string, until: string) => `WITH
  asked AS (SELECT value AS id FROM json_each(:jobs)),
  had AS (
    SELECT job_id, lot_id, hardware_id, quantity AS held, 0 AS taken FROM (${held}) WHERE job_id IN (SELECT id FROM asked)
    UNION ALL
    SELECT job_id, lot_id, hardware_id, 0, -quantity FROM stock_movement
    WHERE job_id IN (SELECT id FROM asked) AND from_lot_id IS NULL ${until})
  SELECT had.job_id, had.hardware_id, lot.leather_id, SUM(had.held) AS held, SUM(had.taken) AS taken
  FROM had LEFT JOIN lot ON lot.id = had.lot_id GROUP BY had.job_id, had.hardware_id, lot.leather_id`;

/** What is held beyond what is there, with who holds it. */
const brokenOf = (held: string, there: string) => `WITH
  kept AS (SELECT lot_id, hardware_id, SUM(quantity) AS quantity FROM (${held}) GROUP BY lot_id, hardware_id),
  short AS (SELECT kept.lot_id, kept.hardware_id, kept.quantity - COALESCE(there.quantity, 0) AS missing
    FROM kept LEFT JOIN (${there}) there ON there.lot_id IS kept.lot_id AND there.hardware_id IS kept.hardware_id
    WHERE kept.quantity > COALESCE(there.quantity, 0))
  SELECT short.hardware_id, lot.leather_id, short.missing,
    (SELECT json_group_array(json_array(job_id, quantity) ORDER BY promised_on DESC, job_id DESC) FROM (
      SELECT h.job_id, o.promised_on, SUM(h.quantity) AS quantity
      FROM (${held}) h JOIN job j ON j.id = h.job_id JOIN customer_order o ON o.id = j.order_id
      WHERE h.lot_id IS short.lot_id AND h.hardware_id IS short.hardware_id
      GROUP BY h.job_id HAVING SUM(h.quantity) > 0)) AS holders
  FROM short LEFT JOIN lot ON lot.id = short.lot_id`;

const thereNow = 'SELECT lot_id, hardware_id, on_hand AS quantity FROM stock_balance';
const thereThen = `SELECT lot_id, hardware_id, SUM(quantity) AS quantity FROM stock_movement
  WHERE day <= :on GROUP BY lot_id, hardware_id`;

/** What open jobs need, hold and have taken, and where a count found less than they hold. */
export async function readHoldings(em: EntityManager, then: DayOver | null): Promise<Holdings> {
  const named = { ...then };
  const jobs = await run<JobRow>(em, then === null ? openNow : openThen, named);
  const ids = JSON.stringify(jobs.map(({ id }) => id));
  const holdings = await run<Holding>(
    em,
    then === null ? holdingsOf(heldNow, '') : holdingsOf(heldThen, 'AND day <= :on'),
    { ...named, jobs: ids },
  );
  const broken = await run<BrokenRow>(
    em,
    then === null ? brokenOf(heldNow, thereNow) : brokenOf(heldThen, thereThen),
    named,
  );
  return { jobs, holdings, broken };
}

/** A statement with its values by name. */
function run<Row>(
  em: EntityManager,
  sql: string,
  named: Partial<Record<'on' | 'over' | 'jobs', string>>,
): Promise<Row[]> {
  const values: string[] = [];
  const numbered = sql.replace(/:(on|over|jobs)\b/g, (_, name: 'on' | 'over' | 'jobs') => {
    values.push(named[name] ?? '');
    return '?';
  });
  return em.execute<Row[]>(numbered, values);
}
