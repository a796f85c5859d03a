import type { Decimal } from 'decimal.js';
import type { EntityManager, FilterQuery } from '@mikro-orm/sqlite';
import { minutesPer100, unusualRuns, type Unusual } from '@hidewright/domain';
import { Customer } from '../../modules/customers/customer.entity.ts';
import { Job } from '../../modules/jobs/job.entity.ts';
import { JobStep } from '../../modules/jobs/job-step.entity.ts';
import {
  countsPieces,
  handledIn,
  piecesRun,
  piecesSpoiled,
} from '../../modules/jobs/step-limits.ts';
import { Order } from '../../modules/orders/order.entity.ts';
import { PatternVersion } from '../../modules/patterns/pattern-version.entity.ts';
import { usedBy, type Used } from '../used-by-job.ts';

const mostRuns = 8;

/** A finished job as the next estimate of its pattern looks at it. */
export interface PastRun {
  job: Job;
  customer: Customer;
  patternVersion: number;
  steps: JobStep[];
  used: Used;
  /** Pieces that went under the press. */
  cut: number;
  /** Null where nobody counted at the bench, or pieces went missing where nobody did. */
  rejects: number | null;
  minutesPer100: Decimal | null;
  unusual: Unusual | null;
}

/**
 * The last finished jobs of a pattern, newest first, whichever version they were made by: of one customer, or, where
 * it is null, of all. What was cancelled says nothing of a run that was wanted.
 */
export async function pastRuns(
  em: EntityManager,
  patternId: number,
  customerId: number | null,
): Promise<PastRun[]> {
  const versions = await em.find(PatternVersion, { patternId }, { fields: ['id', 'number'] });
  const numbers = new Map(versions.map(({ id, number }) => [id, number]));
  const jobs = await em.find(
    Job,
    {
      patternVersionId: { $in: [...numbers.keys()] },
      state: 'finished',
      orderId: { $nin: await idsOf(em, { state: 'cancelled' }) },
      ...(customerId !== null && { $and: [{ orderId: { $in: await idsOf(em, { customerId }) } }] }),
    },
    { orderBy: { finishedAt: 'desc', id: 'desc' }, limit: mostRuns },
  );
  const steps = await em.find(
    JobStep,
    { jobId: { $in: jobs.map(({ id }) => id) } },
    { orderBy: { position: 'asc' } },
  );
  const runs: Omit<PastRun, 'unusual'>[] = [];
  for (const job of jobs) {
    const own = steps.filter(({ jobId }) => jobId === job.id);
    const patternVersion = numbers.get(job.patternVersionId) ?? 0;
    const { customerId: whose } = await em.findOneOrFail(Order, job.orderId);
    const customer = await em.findOneOrFail(Customer, whose);
    runs.push({ ...runOf(job, own, await usedBy(em, job, own)), customer, patternVersion });
  }
  return withUnusual(runs);
}

async function idsOf(em: EntityManager, where: FilterQuery<Order>): Promise<number[]> {
  const orders = await em.find(Order, where, { fields: ['id'] });
  return orders.map(({ id }) => id);
}

/** Who has had finished runs of a pattern, and how many, the most first. */
export async function customersOf(
  em: EntityManager,
  patternId: number,
): Promise<{ id: number; name: string; runs: number }[]> {
  return em.execute(
    `SELECT customer.id, customer.name, COUNT(*) AS runs FROM job
      JOIN pattern_version ON pattern_version.id = job.pattern_version_id
      JOIN customer_order ON customer_order.id = job.order_id
      JOIN customer ON customer.id = customer_order.customer_id
      WHERE pattern_version.pattern_id = ? AND job.state = 'finished' AND customer_order.state <> 'cancelled'
      GROUP BY customer.id ORDER BY runs DESC, customer.name`,
    [patternId],
  );
}

/** Where a step was not counted to its end, what came out and what was spoiled is what was cut. */
function runOf(job: Job, steps: JobStep[], used: Used) {
  const spoiled = piecesSpoiled(steps);
  const cut = Math.max(piecesRun(steps), job.good + job.seconds + spoiled);
  const minutes = used.minutes?.toString();
  return {
    ...{ job, steps, used, cut },
    rejects: allAccountedFor(job, steps, spoiled) ? spoiled : null,
    minutesPer100: minutes === undefined ? null : minutesPer100({ minutes, pieces: cut }),
  };
}

/** Pieces that went missing at a step that nobody counted may be rejects or overs: then the rejects are not known. */
function allAccountedFor(job: Job, steps: readonly JobStep[], spoiled: number): boolean {
  const counted = piecesRun(steps);
  if (counted === 0) return false;
  const everyStep = steps.filter(countsPieces).every((step) => handledIn(step) > 0);
  return everyStep || job.good + job.seconds + spoiled >= counted;
}

function withUnusual(runs: Omit<PastRun, 'unusual'>[]): PastRun[] {
  const unusual = unusualRuns(
    runs.map((run) => ({
      minutesPer100: run.minutesPer100?.toNumber() ?? null,
      rejected: run.rejects,
      reached: run.cut,
    })),
  );
  return runs.map((run, at) => ({ ...run, unusual: unusual[at] ?? null }));
}
