import {
  afterWait,
  type Bench,
  capacityOn,
  type Clock,
  opensAt,
  type WorkPart,
} from './bench-time.ts';
import { byPromise, type HeldWork, partsOf } from './held-work.ts';
import { addDays, type Day, daysBetween } from './day.ts';

interface Share {
  jobId: number;
  minutes: number;
}

export interface PlannedDay {
  day: Day;
  capacity: number;
  shares: Share[];
}

interface Queued {
  jobId: number;
  parts: WorkPart[];
  /** When its next part may begin. */
  ready: Clock;
}

/**
 * Lays the work over the coming days, earliest promise first among what may be worked on; while
 * pieces lie, other work goes on.
 */
export function planDays(bench: Bench, work: readonly HeldWork[], lastDay: Day): PlannedDay[] {
  const queue: Queued[] = byPromise(work).map((held) => ({
    jobId: held.jobId,
    parts: partsOf(held).map((part) => ({ ...part })),
    ready: { day: bench.today, at: 0 },
  }));
  return daysFrom(bench.today, lastDay).map((day) => {
    const capacity = capacityOn(bench, day);
    return { day, capacity, shares: capacity === 0 ? [] : sharesOf(bench, queue, day) };
  });
}

/** The calendar days from the first to the last, both included. */
function daysFrom(first: Day, last: Day): Day[] {
  return Array.from({ length: daysBetween(first, last) + 1 }, (_, at) => addDays(first, at));
}

function sharesOf(bench: Bench, queue: readonly Queued[], day: Day): Share[] {
  const minutesOf = new Map<number, number>();
  let at = opensAt(bench, day);
  while (at < bench.perDay) {
    const opens = opening(queue, day, at);
    if (opens === null || opens.at >= bench.perDay) break;
    const { next } = opens;
    at = opens.at;
    const minutes = Math.min(
      next.parts[0]?.minutes ?? 0,
      until(queue, next, day, at) - at,
      bench.perDay - at,
    );
    if (minutes > 0) minutesOf.set(next.jobId, (minutesOf.get(next.jobId) ?? 0) + minutes);
    at += minutes;
    workOff(bench, next, minutes, { day, at });
  }
  return [...minutesOf].map(([jobId, minutes]) => ({ jobId, minutes }));
}

/** What comes next, and when: at once, or when the first wait of the day is over. */
function opening(
  queue: readonly Queued[],
  day: Day,
  at: number,
): { next: Queued; at: number } | null {
  let best: { next: Queued; at: number } | null = null;
  for (const next of queue) {
    if (next.parts.length === 0 || next.ready.day > day) continue;
    const begins = next.ready.day === day ? Math.max(at, next.ready.at) : at;
    if (best === null || begins < best.at) best = { next, at: begins };
  }
  return best;
}

/** Until something promised earlier may go on. */
function until(queue: readonly Queued[], working: Queued, day: Day, at: number): number {
  const earlier = queue.slice(0, queue.indexOf(working));
  const begins = earlier
    .filter(({ parts, ready }) => parts.length > 0 && ready.day === day && ready.at > at)
    .map(({ ready }) => ready.at);
  return Math.min(Infinity, ...begins);
}

function workOff(bench: Bench, queued: Queued, minutes: number, now: Clock): void {
  const [part] = queued.parts;
  if (part === undefined) return;
  part.minutes -= minutes;
  if (part.minutes > 0) return;
  queued.parts.shift();
  queued.ready = afterWait(bench, now, part.waitAfter);
}
