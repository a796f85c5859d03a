import { Decimal } from 'decimal.js';
import type { EntityManager } from '@mikro-orm/sqlite';
import { unscaled } from '../db/columns/scaled-decimal.ts';
import type { Job } from '../modules/jobs/job.entity.ts';
import type { JobStep } from '../modules/jobs/job-step.entity.ts';
import { minutesLogged } from '../modules/jobs/minutes-logged.ts';
import { StockMovement } from '../modules/stock/stock-movement.entity.ts';

/** What a job really used; null where nothing was logged that could say it. */
export interface Used {
  minutes: Decimal | null;
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
    leatherAreaMm2: leather.length === 0 ? null : unscaled(taken(leather), 3).toString(),
    leatherCost: leather.length === 0 ? null : costOf(leather),
    hardwareCount: hardware.length === 0 ? null : taken(hardware),
    hardwareCost: hardware.length === 0 ? null : costOf(hardware),
  };
}

const taken = (moved: readonly StockMovement[]): number =>
  moved.reduce((sum, { quantity }) => sum - quantity, 0);

const costOf = (moved: readonly StockMovement[]): Decimal =>
  moved.reduce((sum, { value }) => sum.minus(value), new Decimal(0));
