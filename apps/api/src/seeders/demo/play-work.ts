import { Decimal } from 'decimal.js';
import { unscaled } from '../../db/columns/scaled-decimal.ts';
import { finishJob } from '../../flows/finish-job.ts';
import { putOffcutBack } from '../../flows/put-offcut-back.ts';
import { logBench } from '../../flows/log-bench.ts';
import { takeForJob } from '../../flows/take-for-job.ts';
import { stepsOf } from '../../modules/jobs/find-job.ts';
import { Job } from '../../modules/jobs/job.entity.ts';
import type { JobStep } from '../../modules/jobs/job-step.entity.ts';
import { piecesSpoiled, stepLimits } from '../../modules/jobs/step-limits.ts';
import { Reservation } from '../../modules/stock/reservation.entity.ts';
import { StockMovement } from '../../modules/stock/stock-movement.entity.ts';
import type { Work } from '../../work.ts';
import type { Played, Stage } from './stage.ts';
import type { DemoRun } from './scenario/runs.ts';

/** The maker takes what is held on the first day, works the steps over three, and finishes on the third. */
export function planWork({ shop, year }: Stage, played: Played): void {
  const { run } = played;
  const at = (days: number, time: string, useCase: (work: Work, job: Job) => Promise<void>) =>
    year.planAfter(...first(run, days), time, () =>
      shop.as('maker', async (work) =>
        useCase(work, await work.em.findOneOrFail(Job, { orderId: played.orderId })),
      ),
    );
  at(0, '08:30', takeHeld);
  at(0, '11:50', (work, job) => workSteps(work, job, run, 0, 2));
  if (run.fate === 'at the bench') return;
  at(1, '11:30', (work, job) => workSteps(work, job, run, 2, 3));
  at(1, '15:45', (work, job) => workSteps(work, job, run, 3, 4));
  at(2, '11:10', (work, job) => workSteps(work, job, run, 4, 99));
  at(2, '11:30', (work, job) => bringOffcut(work, job, run));
  at(2, '11:40', (work, job) => finish(work, job, run));
}

/** A run that is under way was begun the day before the year ends. */
function first(run: DemoRun, days: number): [daysBefore: number, workdays: number] {
  return run.fate === 'at the bench' ? [1, days] : [run.daysBefore, 8 + days];
}

async function takeHeld(work: Work, job: Job): Promise<void> {
  for (const { lotId, hardwareId, open } of await work.em.find(Reservation, {
    jobId: job.id,
    open: { $gt: 0 },
  })) {
    if (lotId !== null)
      await takeForJob(work, job.id, { lotId, areaMm2: unscaled(open, 3).toString() });
    if (hardwareId !== null) await takeForJob(work, job.id, { hardwareId, quantity: open });
  }
}

async function workSteps(
  work: Work,
  job: Job,
  run: DemoRun,
  from: number,
  until: number,
): Promise<void> {
  for (const { id } of (await stepsOf(work.em, job.id)).slice(from, until)) {
    const steps = await stepsOf(work.em, job.id);
    const at = steps.findIndex((step) => step.id === id);
    const step = steps[at] as JobStep;
    const limit = stepLimits(job, steps)[at] ?? 0;
    const rejects = spoiledAt(step, limit, run);
    await logBench(work, job.id, {
      stepId: id,
      good: limit - rejects,
      rejects,
      seconds: 0,
      minutes: minutesOf(step, run),
      note: '',
    });
  }
}

function spoiledAt(step: JobStep, limit: number, run: DemoRun): number {
  const share = step.rejectPercent.dividedBy(100).times(run.spoiled);
  return share.times(limit).toDecimalPlaces(0, Decimal.ROUND_HALF_UP).toNumber();
}

const minutesOf = (step: JobStep, run: DemoRun) =>
  step.plannedMinutes.times(run.slower).toDecimalPlaces(0, Decimal.ROUND_HALF_UP).toString();

/** What is left of the first lot that it took from goes to the bin for offcuts. */
async function bringOffcut(work: Work, job: Job, { offcut }: DemoRun): Promise<void> {
  if (offcut === undefined) return;
  const taken = await work.em.findOneOrFail(
    StockMovement,
    { jobId: job.id, lotId: { $ne: null } },
    { orderBy: { id: 'asc' } },
  );
  const lotId = taken.lotId ?? 0;
  await putOffcutBack(work, job.id, { lotId, ...offcut, areaMm2: null, place: 'offcut bin' });
}

/** What was ordered and a few over; one piece in fifty passes as a second. */
async function finish(work: Work, job: Job, run: DemoRun): Promise<void> {
  const left = job.cutCount - piecesSpoiled(await stepsOf(work.em, job.id));
  const seconds = Math.min(Math.floor(run.chosen / 50), Math.max(0, left - run.chosen));
  await finishJob(work, job.id, {
    good: left - seconds,
    seconds,
    leatherLeft: [],
    hardwareLeft: [],
  });
}
