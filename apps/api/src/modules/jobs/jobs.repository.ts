import type { Awaited, JobCard, JobState } from '@hidewright/contract';
import type { EntityManager } from '@mikro-orm/sqlite';
import { unscaled } from '../../db/columns/scaled-decimal.ts';
import { JobStep } from './job-step.entity.ts';
import { shareDone, stepLimits } from './step-limits.ts';
import { minutesLogged } from './minutes-logged.ts';

interface JobRow {
  id: number;
  number: string;
  state: JobState;
  order_id: number;
  cancelled: number;
  title: string;
  customer_name: string;
  quantity: number;
  cut_count: number;
  containers: number;
  promised_on: string;
  in_hands_on: string | null;
  awaits: string;
  planned_minutes: number;
  good: number;
  seconds: number;
}

export interface JobFilter {
  below: number | undefined;
  limit: number;
  q: string | undefined;
  state: JobState | undefined;
  open: boolean | undefined;
}

/** Nothing more is made of it. */
const over = `(j.state = 'finished' OR o.state = 'cancelled')`;

/** Jobs, newest first, one more than the limit where there are more. */
export async function findJobs(em: EntityManager, filter: JobFilter): Promise<JobCard[]> {
  const conditions = ['1 = 1'];
  const values: (string | number)[] = [];
  const where = (condition: string, ...given: (string | number)[]) => {
    conditions.push(condition);
    values.push(...given);
  };
  if (filter.below !== undefined) where('j.id < ?', filter.below);
  if (filter.state !== undefined) where(`j.state = ? AND o.state <> 'cancelled'`, filter.state);
  if (filter.open !== undefined) where(filter.open ? `NOT ${over}` : over);
  if (filter.q !== undefined) {
    const like = `%${filter.q}%`;
    where(
      '(j.number LIKE ? OR o.title LIKE ? OR c.name LIKE ? OR o.number LIKE ?)',
      like,
      like,
      like,
      like,
    );
  }
  const rows = await em.execute<JobRow[]>(
    `SELECT j.id, j.number, j.state, j.order_id, o.state = 'cancelled' AS cancelled, o.title, c.name AS customer_name, j.quantity, j.cut_count, j.containers,
      o.promised_on, o.in_hands_on, o.awaits, j.planned_minutes, j.good, j.seconds
    FROM job j JOIN customer_order o ON o.id = j.order_id JOIN customer c ON c.id = o.customer_id
    WHERE ${conditions.join(' AND ')} ORDER BY j.id DESC LIMIT ?`,
    [...values, filter.limit + 1],
  );
  const steps = await em.find(
    JobStep,
    { jobId: { $in: rows.map(({ id }) => id) } },
    { orderBy: { position: 'asc' } },
  );
  return rows.map((row) =>
    toCard(
      row,
      steps.filter(({ jobId }) => jobId === row.id),
    ),
  );
}

function toCard(row: JobRow, steps: JobStep[]): JobCard {
  const limits = stepLimits({ cutCount: row.cut_count, containers: row.containers }, steps);
  const progress = steps.map((step, at) => shareDone(step, limits[at] ?? 0));
  return {
    id: row.id,
    number: row.number,
    state: row.state,
    orderId: row.order_id,
    cancelled: row.cancelled === 1,
    title: row.title,
    customerName: row.customer_name,
    quantity: row.quantity,
    cutCount: row.cut_count,
    promisedOn: row.promised_on,
    inHandsOn: row.in_hands_on,
    awaits: JSON.parse(row.awaits) as Awaited[],
    plannedMinutes: unscaled(row.planned_minutes, 2).toString(),
    loggedMinutes: minutesLogged(steps),
    progress,
    step: steps[progress.findIndex((share) => share < 1)]?.name ?? null,
    good: row.good,
    seconds: row.seconds,
  };
}
