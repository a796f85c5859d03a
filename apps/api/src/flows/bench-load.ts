import {
  ticketSteps,
  waitAfter,
  type Bench,
  type HeldWork,
  type WorkPart,
} from '@hidewright/domain';
import type { EntityManager } from '@mikro-orm/sqlite';
import { scaled } from '../db/columns/scaled-decimal.ts';
import { JobStep } from '../modules/jobs/job-step.entity.ts';
import { shareDone, stepLimits } from '../modules/jobs/step-limits.ts';
import { Workshop } from '../modules/workshop/workshop.entity.ts';
import type { Work } from '../work.ts';
import type { JobEstimate } from './job-estimate.ts';

/** A job that is not finished, with what is still to do on it. */
export interface OpenJob extends HeldWork {
  number: string;
  title: string;
}

interface OpenRow {
  id: number;
  number: string;
  title: string;
  promised_on: string;
  cut_count: number;
  containers: number;
  estimate: string;
}

/** Every job that holds bench hours, whatever its state: hours are held from taking on until it is finished. */
export async function openJobs(em: EntityManager): Promise<OpenJob[]> {
  const rows = await em.execute<OpenRow[]>(
    `SELECT j.id, j.number, o.title, o.promised_on, j.cut_count, j.containers, j.estimate
    FROM job j JOIN customer_order o ON o.id = j.order_id
    WHERE j.state <> 'finished' AND o.state <> 'cancelled' ORDER BY j.id`,
  );
  if (rows.length === 0) return [];
  const steps = await em.find(
    JobStep,
    { jobId: { $in: rows.map(({ id }) => id) } },
    { orderBy: { position: 'asc' } },
  );
  return rows.map((row) => {
    const parts = partsLeft(
      row,
      steps.filter(({ jobId }) => jobId === row.id),
    );
    return {
      jobId: row.id,
      number: row.number,
      title: row.title,
      promisedOn: row.promised_on,
      remaining: parts.reduce((sum, { minutes }) => sum + minutes, 0),
      ...(parts.some((part) => part.waitAfter > 0) && { parts }),
    };
  });
}

/**
 * By what is counted, not by the clock: a step half done has half its planned minutes to go. After a step that is done,
 * its wait is taken as over, for nobody writes down when it began.
 */
function partsLeft(row: OpenRow, steps: JobStep[]): WorkPart[] {
  const limits = stepLimits({ cutCount: row.cut_count, containers: row.containers }, steps);
  const { input } = JSON.parse(row.estimate) as JobEstimate;
  const planned = ticketSteps(input.work);
  return steps.map((step, at) => {
    const left = 1 - shareDone(step, limits[at] ?? 0);
    return {
      minutes: Math.round(scaled(step.plannedMinutes, 2) * left),
      waitAfter: left > 0 ? waitAfter(planned[at]) : 0,
    };
  });
}

/** The bench as it stands today. */
export async function benchToday({ em, today }: Work): Promise<Bench> {
  const { benchHoursPerDay } = await em.findOneOrFail(Workshop, 1);
  const logged = await loggedOn(em, today);
  return { today, perDay: scaled(benchHoursPerDay.times(60), 2), loggedToday: logged };
}

async function loggedOn(em: EntityManager, day: string): Promise<number> {
  const [row] = await em.execute<[{ minutes: number }]>(
    'SELECT COALESCE(SUM(minutes), 0) AS minutes FROM bench_log WHERE day = ?',
    [day],
  );
  return Math.max(0, row.minutes);
}
