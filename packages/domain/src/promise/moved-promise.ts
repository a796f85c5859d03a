import { earliestDay, shortByPromise, type LateWork } from './bench-plan.ts';
import type { Bench } from './bench-time.ts';
import type { Day } from './day.ts';
import type { HeldWork } from './held-work.ts';

export interface MovedPromise {
  /** hundredths of a minute of the moved job that cannot be done by its new day; null where all of it can */
  short: number | null;
  /** the first day by which it can be done without breaking another promise; null where a year does not suffice */
  earliest: Day | null;
  /** other jobs that the move makes late, or later than they were */
  pushed: LateWork[];
}

/**
 * What the bench can keep once one job is promised for another day, all other promises as they are.
 * @param work all that is held; a job that is not among it has nothing left to do
 */
export function movedPromise(
  bench: Bench,
  work: readonly HeldWork[],
  { jobId, to }: { jobId: number; to: Day },
): MovedPromise {
  const moved = work.find((held) => held.jobId === jobId);
  if (moved === undefined) return { short: null, earliest: bench.today, pushed: [] };
  const others = work.filter((held) => held !== moved);
  const shortBefore = new Map(shortByPromise(bench, work).map((late) => [late.jobId, late.short]));
  const after = shortByPromise(bench, [...others, { ...moved, promisedOn: to }]);
  return {
    short: after.find((late) => late.jobId === jobId)?.short ?? null,
    earliest: earliestDay(bench, others, moved.remaining, moved.parts && { parts: moved.parts }),
    pushed: after.filter(
      (late) => late.jobId !== jobId && late.short > (shortBefore.get(late.jobId) ?? -1),
    ),
  };
}
