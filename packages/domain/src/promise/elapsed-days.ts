import { afterWait, type Bench, type Clock, opensAt, type WorkPart } from './bench-time.ts';
import { addDays, type Day, daysBetween } from './day.ts';
import { isWorkday } from './workdays.ts';

/** Further ahead nothing is promised. */
const furthest = 1100;

/**
 * The day on which work is done with, begun on a day with nothing else in its way: its minutes one
 * after another in the bench's hours, its waits running on through the night. No run is sooner done,
 * for its time is at least its bench minutes and its shortest waits.
 * @returns null where three years do not suffice
 */
export function doneOn(bench: Bench, parts: readonly WorkPart[], from: Day): Day | null {
  return walkThrough(bench, parts, from)?.end ?? null;
}

/** How many hundredths of a minute of the work can be done from one day up to and including another. */
export function doneBy(bench: Bench, parts: readonly WorkPart[], by: Day): number {
  let done = 0;
  walkThrough(bench, parts, bench.today, (day, minutes) => {
    if (day <= by) done += minutes;
  });
  return done;
}

function walkThrough(
  bench: Bench,
  parts: readonly WorkPart[],
  from: Day,
  worked: (day: Day, minutes: number) => void = () => undefined,
): { end: Day } | null {
  const first = from < bench.today ? bench.today : from;
  let clock: Clock = { day: first, at: opensAt(bench, first) };
  let end = first;
  for (const { minutes, waitAfter } of parts) {
    const after = workOn(bench, clock, minutes, worked);
    if (after === null) return null;
    clock = afterWait(bench, after, waitAfter);
    if (minutes > 0 || waitAfter > 0) end = clock.day;
  }
  return { end };
}

/** Work without a break, from the first day that has room; null where none has. */
function workOn(
  bench: Bench,
  { day, at }: Clock,
  minutes: number,
  worked: (day: Day, minutes: number) => void,
): Clock | null {
  let left = minutes;
  while (left > 0) {
    const done = isWorkday(day) ? Math.min(left, Math.max(0, bench.perDay - at)) : 0;
    if (done > 0) worked(day, done);
    left -= done;
    at += done;
    if (left === 0) break;
    [day, at] = [addDays(day, 1), 0];
    if (daysBetween(bench.today, day) > furthest) return null;
  }
  return { day, at };
}
