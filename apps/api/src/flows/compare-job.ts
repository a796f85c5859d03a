import type { Compared, JobComparison } from '@hidewright/contract';
import {
  compareRun,
  rejectShare,
  toAtMost,
  type BreakNumbers,
  type CompareName,
  type RunFact,
} from '@hidewright/domain';
import { Decimal } from 'decimal.js';
import { findWantedJob, requireJobState, stepsOf } from '../modules/jobs/find-job.ts';
import type { Job } from '../modules/jobs/job.entity.ts';
import type { JobStep } from '../modules/jobs/job-step.entity.ts';
import { piecesRun, piecesSpoiled } from '../modules/jobs/step-limits.ts';
import type { Work } from '../work.ts';
import { compareMoney } from './compare-money.ts';
import { estimateOf, numbersOf } from './job-estimate.ts';
import { usedBy, type Used } from './used-by-job.ts';

/** Estimate and fact of a finished job. @throws {Problem} 404, 409 while it is not finished */
export async function compareFinished({ em }: Work, jobId: number): Promise<JobComparison> {
  const job = await findWantedJob(em, jobId);
  requireJobState(job, 'finished');
  const steps = await stepsOf(em, jobId);
  const used = await usedBy(em, job, steps);
  const numbers = numbersOf(estimateOf(job));
  return {
    work: compareWork(job, steps, used, numbers),
    money: compareMoney(estimateOf(job).input, numbers, used),
  };
}

const words: Record<CompareName, string> = {
  'minutes per 100': 'Minutes per 100 cut',
  minutes: 'Bench minutes',
  cut: 'Pieces cut',
  good: 'Good pieces',
  rejects: 'Rejects',
  leather: 'Leather',
};

function compareWork(job: Job, steps: JobStep[], used: Used, numbers: BreakNumbers): Compared[] {
  const { input, hardware } = estimateOf(job);
  const fact = factOf(job, steps, used);
  const estimate = {
    cut: numbers.cutCount,
    good: job.quantity,
    minutes: numbers.benchMinutes,
    leatherAreaMm2: numbers.leatherAreaMm2,
    rejectPercent: toAtMost(new Decimal(rejectShare(input.work)).times(100), 2),
  };
  const rows = compareRun({ estimate, fact }).map(({ name, unit, said, was }) => ({
    what: words[name],
    unit,
    estimate: said,
    fact: isKnown(name, used) ? was : null,
  }));
  return [
    ...rows,
    {
      what: 'Seconds',
      unit: 'pieces',
      estimate: String(numbers.seconds),
      fact: String(job.seconds),
    },
    ...hardwareRow(
      hardware.reduce((sum, { quantity }) => sum + quantity, 0),
      used,
    ),
  ];
}

function isKnown(name: CompareName, used: Used): boolean {
  if (name === 'minutes' || name === 'minutes per 100') return used.minutes !== null;
  return name !== 'leather' || used.leatherAreaMm2 !== null;
}

function hardwareRow(asked: number, { hardwareCount }: Used): Compared[] {
  if (asked === 0 && hardwareCount === null) return [];
  const fact = hardwareCount === null ? null : String(hardwareCount);
  return [{ what: 'Hardware', unit: 'pieces', estimate: String(asked), fact }];
}

/** Where a step was not counted to its end, what came out and what was spoiled is what was cut. */
function factOf(job: Job, steps: JobStep[], used: Used): RunFact {
  const rejects = piecesSpoiled(steps);
  return {
    cut: Math.max(piecesRun(steps), job.good + job.seconds + rejects),
    good: job.good,
    rejects,
    seconds: job.seconds,
    minutes: (used.minutes ?? new Decimal(0)).toString(),
    leatherAreaMm2: used.leatherAreaMm2 ?? '0',
  };
}
