import { latestStart, partsOf, type Bench } from '@hidewright/domain';
import type { Work } from '../../work.ts';
import { benchToday, openJobs, type OpenJob } from '../bench-load.ts';
import { readOwedToJobs, type OwedToJob, type OwedToJobs } from './owed-to-jobs.ts';

interface OwedByStart {
  bench: Bench;
  held: OpenJob[];
  /** Dated by the day on which the job has to be begun at the latest, for then it must be there. */
  owed: OwedToJobs;
}

/** What open jobs still need, by when they need it; and the bench with its work, which says that. */
export async function readOwedByStart(work: Work): Promise<OwedByStart> {
  const bench = await benchToday(work);
  const held = await openJobs(work.em);
  const owed = await readOwedToJobs(work.em);
  const startOf = startsOf(bench, held);
  const byStart = (all: OwedToJob[]): OwedToJob[] =>
    all
      .map((each) => ({ ...each, day: startOf(each) }))
      .sort((a, b) => (a.day < b.day ? -1 : Number(a.day > b.day)));
  return {
    bench,
    held,
    owed: {
      hardware: (id) => byStart(owed.hardware(id)),
      leather: (id) => byStart(owed.leather(id)),
    },
  };
}

/** A job that is late already needs it today. */
function startsOf(bench: Bench, held: readonly OpenJob[]): (owed: OwedToJob) => string {
  const known = new Map<number, string>();
  return ({ jobId, day }) => {
    const job = held.find((each) => each.jobId === jobId);
    if (job === undefined) return day;
    const start =
      known.get(jobId) ??
      latestStart(
        bench,
        held.filter((each) => each !== job),
        { minutes: job.remaining, parts: partsOf(job), by: job.promisedOn },
      ) ??
      bench.today;
    known.set(jobId, start);
    return start;
  };
}
