import { Decimal } from 'decimal.js';
import type { EntityManager } from '@mikro-orm/sqlite';
import { ticketSteps } from '@hidewright/domain';
import { unscaled } from '../db/columns/scaled-decimal.ts';
import { BenchLog } from '../modules/jobs/bench-log.entity.ts';
import type { Job } from '../modules/jobs/job.entity.ts';
import type { JobStep } from '../modules/jobs/job-step.entity.ts';
import { handledAtEnd, stepLimits } from '../modules/jobs/step-limits.ts';
import { minutesLogged } from '../modules/jobs/minutes-logged.ts';
import { StockMovement } from '../modules/stock/stock-movement.entity.ts';
import { estimateOf } from './job-estimate.ts';

/** What a job really used; null where nothing was logged that could say it. */
export interface Used {
  minutes: Decimal | null;
  /** What the work was paid: minutes at the wage of whoever logged them, else the estimate's; or by the piece. */
  wages: Decimal | null;
  leatherAreaMm2: string | null;
  leatherCost: Decimal | null;
  hardwareCount: number | null;
  hardwareCost: Decimal | null;
}

export async function usedBy(em: EntityManager, job: Job, steps: JobStep[]): Promise<Used> {
  const moved = await em.find(StockMovement, { jobId: job.id });
  const leather = moved.filter(({ lotId }) => lotId !== null);
  const hardware = moved.filter(({ hardwareId }) => hardwareId !== null);
  const minutes = new Decimal(minutesLogged(steps));
  return {
    minutes: minutes.isZero() ? null : minutes,
    wages: minutes.isZero() ? null : await wagesOf(em, job, steps),
    leatherAreaMm2: leather.length === 0 ? null : unscaled(taken(leather), 3).toString(),
    leatherCost: leather.length === 0 ? null : costOf(leather),
    hardwareCount: hardware.length === 0 ? null : taken(hardware),
    hardwareCost: hardware.length === 0 ? null : costOf(hardware),
  };
}

async function wagesOf(em: EntityManager, job: Job, steps: readonly JobStep[]): Promise<Decimal> {
  const { wagePerHour, wagesByStep = false, work } = estimateOf(job).input;
  const planned = wagesByStep && work.kind === 'steps' ? ticketSteps(work) : [];
  const limits = stepLimits(job, [...steps]);
  const byPiece = steps.map((step, at) => {
    const rate = planned[at]?.pieceRate ?? null;
    return rate === null ? null : new Decimal(rate).times(handledAtEnd(step, limits[at] ?? 0));
  });
  const logs = await em.find(BenchLog, { jobStepId: { $in: steps.map(({ id }) => id) } });
  const byHour = new Set(steps.filter((_, at) => byPiece[at] === null).map(({ id }) => id));
  const paid = logs
    .filter(({ jobStepId }) => byHour.has(jobStepId ?? 0))
    .reduce(
      (sum, log) => sum.plus(log.minutes.times(log.wagePerHour ?? wagePerHour)),
      new Decimal(0),
    );
  return byPiece.reduce<Decimal>((sum, each) => sum.plus(each ?? 0), paid.div(60));
}

const taken = (moved: readonly StockMovement[]): number =>
  moved.reduce((sum, { quantity }) => sum - quantity, 0);

const costOf = (moved: readonly StockMovement[]): Decimal =>
  moved.reduce((sum, { value }) => sum.minus(value), new Decimal(0));
