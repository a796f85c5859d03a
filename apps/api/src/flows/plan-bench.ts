import type { BenchDay, BenchHours } from '@hidewright/contract';
import { addDays, planDays, shortByPromise, type Bench, type PlannedDay } from '@hidewright/domain';
import { unscaled } from '../db/columns/scaled-decimal.ts';
import type { Work } from '../work.ts';
import { benchToday, openJobs, type OpenJob } from './bench-load.ts';

/** The coming days of the bench: what each has, and which job will need it, earliest promise first. */
export async function planBench(work: Work, days: number): Promise<BenchHours> {
  const bench = await benchToday(work);
  const jobs = await openJobs(work.em);
  const planned = planDays(bench, jobs, addDays(work.today, days - 1));
  return {
    days: planned.map((day) => toDay(bench, day, jobs)),
    late: shortByPromise(bench, jobs).map(({ jobId, short }) => {
      const { number, title, promisedOn } = named(jobs, jobId);
      return { jobId, number, title, promisedOn, minutesShort: minutesText(short) };
    }),
  };
}

function toDay(
  bench: Bench,
  { day, capacity, shares }: PlannedDay,
  jobs: readonly OpenJob[],
): BenchDay {
  const used = shares.reduce((sum, { minutes }) => sum + minutes, 0);
  const logged = day === bench.today ? bench.loggedToday : 0;
  return {
    day,
    minutes: minutesText(capacity + Math.min(logged, bench.perDay)),
    planned: shares.map(({ jobId, minutes }) => {
      const { number, title } = named(jobs, jobId);
      return { jobId, number, title, minutes: minutesText(minutes) };
    }),
    loggedMinutes: minutesText(logged),
    freeMinutes: minutesText(capacity - used),
    promised: jobs
      .filter(({ promisedOn }) => promisedOn === day)
      .map(({ jobId, number, title }) => ({ jobId, number, title })),
  };
}

const minutesText = (hundredths: number): string => unscaled(hundredths, 2).toString();

function named(jobs: readonly OpenJob[], jobId: number): OpenJob {
  const found = jobs.find((job) => job.jobId === jobId);
  if (found === undefined) throw new TypeError('The plan names a job that is not open');
  return found;
}
