import { addDays, type Day, daysBetween } from './day.ts';
import { isWorkday } from './workdays.ts';

/** Work that the shop has taken on; minutes are whole hundredths, so that sums are exact. */
export interface HeldWork {
  jobId: number;
  promisedOn: string;
  /** What is still to do, in hundredths of a minute. */
  remaining: number;
}

export interface Bench {
  today: string;
  /** Of a working day, in hundredths of a minute. */
  perDay: number;
  /** Worked already today. */
  loggedToday: number;
}

interface Share {
  jobId: number;
  minutes: number;
}

export interface PlannedDay {
  day: string;
  capacity: number;
  shares: Share[];
}

/** The hundredths of a minute that a day still has. */
function capacityOn(bench: Bench, day: string): number {
  if (!isWorkday(day)) return 0;
  return day === bench.today ? Math.max(0, bench.perDay - bench.loggedToday) : bench.perDay;
}

/** Earliest promise first: if any order of work keeps all promises, this one does (Jackson 1955, from memory). */
function byPromise(work: readonly HeldWork[]): HeldWork[] {
  return [...work].sort((a, b) =>
    a.promisedOn < b.promisedOn ? -1 : a.promisedOn > b.promisedOn ? 1 : a.jobId - b.jobId,
  );
}

/** The calendar days from the first to the last, both included. */
function daysFrom(first: Day, last: Day): Day[] {
  return Array.from({ length: daysBetween(first, last) + 1 }, (_, at) => addDays(first, at));
}

/** Lays the work over the coming days, earliest promise first. */
export function planDays(bench: Bench, work: readonly HeldWork[], lastDay: string): PlannedDay[] {
  const queue = byPromise(work).map((held) => ({ ...held }));
  return daysFrom(bench.today, lastDay).map((day) => {
    const capacity = capacityOn(bench, day);
    const shares: Share[] = [];
    let left = capacity;
    for (const held of queue) {
      const minutes = Math.min(left, held.remaining);
      if (minutes === 0) continue;
      held.remaining -= minutes;
      left -= minutes;
      shares.push({ jobId: held.jobId, minutes });
    }
    return { day, capacity, shares };
  });
}

/** What the bench has from today up to and including a day, each day worked out once. */
function capacityOf(bench: Bench): (until: Day) => number {
  const sums = new Map<Day, number>();
  let [reached, sum] = [addDays(bench.today, -1), 0];
  return (until) => {
    while (reached < until) {
      reached = addDays(reached, 1);
      sum += capacityOn(bench, reached);
      sums.set(reached, sum);
    }
    return sums.get(until) ?? 0;
  };
}

/** How much of each job cannot be done by its promised day; jobs that can are left out. */
export function shortByPromise(
  bench: Bench,
  work: readonly HeldWork[],
): { jobId: number; short: number }[] {
  const capacity = capacityOf(bench);
  let before = 0;
  return byPromise(work).flatMap(({ jobId, promisedOn, remaining }) => {
    before += remaining;
    const short = Math.min(remaining, before - capacity(promisedOn));
    return short > 0 ? [{ jobId, short }] : [];
  });
}

/**
 * What the bench can still give to a run promised for a day, so that no promise made before is broken: for that day
 * and every later promise, what there is until then less what is promised by then; the least of these.
 */
export function freeUntil(bench: Bench, work: readonly HeldWork[], by: Day): number {
  return freeWithin(capacityOf(bench), work, by);
}

function freeWithin(capacity: (until: Day) => number, work: readonly HeldWork[], by: Day): number {
  const later = work.map(({ promisedOn }) => promisedOn).filter((day) => day > by);
  const free = [by, ...later].map((day) => capacity(day) - promisedUntil(work, day));
  return Math.max(0, Math.min(...free));
}

const promisedUntil = (work: readonly HeldWork[], day: Day): number =>
  work
    .filter(({ promisedOn }) => promisedOn <= day)
    .reduce((sum, { remaining }) => sum + remaining, 0);

const furthest = 366;

/** The first day by which so much more can be done without breaking a promise; null where a year does not suffice. */
export function earliestDay(bench: Bench, work: readonly HeldWork[], minutes: number): Day | null {
  const capacity = capacityOf(bench);
  for (let after = 0; after <= furthest; after += 1) {
    const day = addDays(bench.today, after);
    if (isWorkday(day) && freeWithin(capacity, work, day) >= minutes) return day;
  }
  return null;
}
