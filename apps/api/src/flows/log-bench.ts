import { Decimal } from 'decimal.js';
import { invalid, type FieldFault } from '../http/problem.ts';
import { BenchLog } from '../modules/jobs/bench-log.entity.ts';
import { findWantedJob, requireJobState, stepsOf } from '../modules/jobs/find-job.ts';
import type { Job } from '../modules/jobs/job.entity.ts';
import type { JobStep } from '../modules/jobs/job-step.entity.ts';
import { handledIn, stepLimits } from '../modules/jobs/step-limits.ts';
import { Person } from '../modules/people/person.entity.ts';
import type { Work } from '../work.ts';
import { startIfReady } from './start-job.ts';

/** What is logged on a step; below zero takes back what was logged by mistake. */
export interface BenchEntry {
  stepId: number;
  good: number;
  rejects: number;
  seconds: number;
  /** Decimal text, at most two decimals. */
  minutes: string;
  note: string;
}

/**
 * Logs minutes and counts on a step: a row in the bench log, and the step's sums, in one transaction.
 * @throws {Problem} 404, 409 when the job is not at the bench, 422 when the counts make no sense
 */
export async function logBench(work: Work, jobId: number, entry: BenchEntry): Promise<Job> {
  const job = await findWantedJob(work.em, jobId);
  requireJobState(job, 'ready', 'at the bench');
  const steps = await stepsOf(work.em, jobId);
  const step = steps.find(({ id }) => id === entry.stepId);
  if (step === undefined)
    throw invalid([
      { field: 'stepId', message: 'This job has no such step. Open its ticket again.' },
    ]);
  const minutes = new Decimal(entry.minutes);
  if (entry.good === 0 && entry.rejects === 0 && entry.seconds === 0 && minutes.isZero()) {
    throw invalid([{ field: 'good', message: 'Count some pieces or minutes first.' }]);
  }
  refuseAny(tooManyLogged(job, steps, step, entry));
  await startIfReady(work, job);
  const { good, rejects, seconds, note } = entry;
  work.em.create(BenchLog, {
    ...{ jobStepId: step.id, good, rejects, seconds, minutes, note },
    at: work.now.toISOString(),
    day: work.today,
    personId: work.actor.id,
    personName: work.actor.name,
    wagePerHour: await wageOf(work),
  });
  step.good += good;
  step.rejects += rejects;
  step.seconds += seconds;
  step.minutes = step.minutes.plus(minutes);
  await work.em.flush();
  return job;
}

async function wageOf({ em, actor }: Work): Promise<Decimal | null> {
  const person = actor.id === null ? null : await em.findOne(Person, actor.id);
  return person?.wagePerHour ?? null;
}

function refuseAny(faults: FieldFault[]): void {
  if (faults.length > 0) throw invalid(faults);
}

type Counted = 'good' | 'rejects' | 'seconds';

function tooManyLogged(job: Job, steps: JobStep[], step: JobStep, entry: BenchEntry): FieldFault[] {
  const after = {
    per: step.per,
    good: step.good + entry.good,
    rejects: step.rejects + entry.rejects,
    seconds: step.seconds + entry.seconds,
  };
  const below = (['good', 'rejects', 'seconds'] as const).filter((field) => after[field] < 0);
  if (below.length > 0) return below.map((field) => ({ field, message: takeBack(step, field) }));
  if (step.minutes.plus(entry.minutes).isNegative()) {
    const message = `Only ${step.minutes.toString()} minutes are logged on ${step.name}. Take back at most that many.`;
    return [{ field: 'minutes', message }];
  }
  const changed = steps.map((each) => (each === step ? after : each));
  const limits = stepLimits(job, changed);
  const at = steps.indexOf(step);
  const limit = limits[at] ?? 0;
  if (handledIn(after) > limit)
    return [{ field: busiest(entry), message: beyond(step, entry, limit) }];
  const starved = changed.findIndex(
    (each, later) => later > at && handledIn(each) > (limits[later] ?? 0),
  );
  return starved < 0
    ? []
    : [{ field: 'rejects', message: starves(steps[starved] as JobStep, limits[starved] ?? 0) }];
}

const words: Record<Counted, string> = { good: 'good', rejects: 'rejects', seconds: 'seconds' };

const takeBack = (step: JobStep, field: Counted): string =>
  `Only ${step[field]} ${words[field]} are logged on ${step.name}. Take back at most that many.`;

/** The field beside which the sentence stands: the count that is largest. */
function busiest(entry: BenchEntry): Counted {
  if (entry.rejects > entry.good && entry.rejects >= entry.seconds) return 'rejects';
  return entry.seconds > entry.good ? 'seconds' : 'good';
}

const units: Record<JobStep['per'], [string, string]> = {
  piece: ['piece', 'pieces'],
  strike: ['piece', 'pieces'],
  panel: ['panel', 'panels'],
  strip: ['strip', 'strips'],
  run: ['run', 'runs'],
};

const countOf = (count: number, per: JobStep['per']): string =>
  `${count} ${units[per][count === 1 ? 0 : 1]}`;

function beyond(step: JobStep, entry: BenchEntry, limit: number): string {
  const logged = handledIn(step);
  const left = Math.max(0, limit - logged);
  const asked = entry.good + entry.rejects + entry.seconds;
  return `${step.name} has ${countOf(limit, step.per)} to work on, and ${logged} are logged: ${asked} more cannot be. Log at most ${left}.`;
}

const starves = (later: JobStep, limit: number): string =>
  `${later.name} has ${handledIn(later)} logged, and this would leave only ${limit} to reach it. Correct ${later.name} first.`;
