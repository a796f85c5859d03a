import { type Bench, capacityOf, type WorkPart } from './bench-time.ts';
import { addDays, type Day, daysBetween } from './day.ts';
import { doneBy, doneOn } from './elapsed-days.ts';
import { byPromise, type HeldWork } from './held-work.ts';
import { isWorkday } from './workdays.ts';

export interface LateWork {
  jobId: number;
  /** hundredths of a minute that cannot be done by then; 0 where only a wait runs on */
  short: number;
}

/** Each job that cannot be done by its promised day, and how much of it; jobs that can are left out. */
export function shortByPromise(bench: Bench, work: readonly HeldWork[]): LateWork[] {
  const capacity = capacityOf(bench);
  let before = 0;
  return byPromise(work).flatMap((held) => {
    before += held.remaining;
    const beyond = Math.min(held.remaining, before - capacity(held.promisedOn));
    const short = Math.max(0, beyond, heldUp(bench, held));
    return short > 0 || endsLate(bench, held) ? [{ jobId: held.jobId, short }] : [];
  });
}

/** What its own waits keep from being done in time. */
const heldUp = (bench: Bench, { parts, remaining, promisedOn }: HeldWork): number =>
  parts === undefined ? 0 : remaining - doneBy(bench, parts, promisedOn);

function endsLate(bench: Bench, { parts, promisedOn }: HeldWork): boolean {
  if (parts === undefined) return false;
  const end = doneOn(bench, parts, bench.today);
  return end === null || end > promisedOn;
}

/**
 * What the bench can still give to a run promised for a day, so that no promise made before is broken: for that day
 * and every later promise, what there is until then less what is promised by then; the least of these.
 * @param from the first day on which the run can be worked on
 */
export function freeUntil(
  bench: Bench,
  work: readonly HeldWork[],
  by: Day,
  from: Day = bench.today,
): number {
  return freeWithin(capacityOf(bench), work, by, from);
}

function freeWithin(
  capacity: (until: Day) => number,
  work: readonly HeldWork[],
  by: Day,
  from: Day,
): number {
  const later = work.map(({ promisedOn }) => promisedOn).filter((day) => day > by);
  const free = [by, ...later].map((day) => capacity(day) - promisedUntil(work, day));
  // Other work can go before the run begins, so all of its own days are its.
  const ownDays = capacity(by) - capacity(addDays(from, -1));
  return Math.max(0, Math.min(ownDays, ...free));
}

const promisedUntil = (work: readonly HeldWork[], day: Day): number =>
  work
    .filter(({ promisedOn }) => promisedOn <= day)
    .reduce((sum, { remaining }) => sum + remaining, 0);

const furthest = 366;

/** What a run asks of the bench beyond its minutes. */
export interface RunAtBench {
  /** the first day on which it can be worked on; today where not said */
  from?: Day;
  /** where pieces must lie between steps */
  parts?: readonly WorkPart[];
}

/**
 * The first day by which so much more can be done without breaking a promise, its waits kept; null where a year
 * does not suffice.
 */
export function earliestDay(
  bench: Bench,
  work: readonly HeldWork[],
  minutes: number,
  { from = bench.today, parts }: RunAtBench = {},
): Day | null {
  const capacity = capacityOf(bench);
  const soonest = parts === undefined ? from : doneOn(bench, parts, from);
  if (soonest === null) return null;
  const first = soonest < bench.today ? bench.today : soonest;
  for (let after = 0; after <= furthest; after += 1) {
    const day = addDays(first, after);
    if (isWorkday(day) && freeWithin(capacity, work, day, from) >= minutes) return day;
  }
  return null;
}

/** The last day on which a run may be begun so that it is done by a day; null where today is too late. */
export function latestStart(
  bench: Bench,
  work: readonly HeldWork[],
  run: { minutes: number; parts: readonly WorkPart[]; by: Day },
): Day | null {
  const capacity = capacityOf(bench);
  const inTime = (from: Day) => {
    const end = doneOn(bench, run.parts, from);
    return end !== null && end <= run.by && freeWithin(capacity, work, run.by, from) >= run.minutes;
  };
  // A later start never ends sooner, so the days that are in time come first.
  let [good, late] = [-1, daysBetween(bench.today, run.by) + 1];
  while (late - good > 1) {
    const middle = Math.floor((good + late) / 2);
    if (inTime(addDays(bench.today, middle))) good = middle;
    else late = middle;
  }
  return good < 0 ? null : addDays(bench.today, good);
}
