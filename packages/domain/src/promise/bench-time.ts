import { addDays, type Day } from './day.ts';
import { isWorkday } from './workdays.ts';

/** The bench as it stands today; minutes are whole hundredths, so that sums are exact. */
export interface Bench {
  today: Day;
  /** Of a working day, in hundredths of a minute. */
  perDay: number;
  /** Worked already today. */
  loggedToday: number;
}

/** A stretch of work, and how long the pieces must lie after it; both in hundredths of a minute. */
export interface WorkPart {
  minutes: number;
  /** Takes no hands: other work goes on. */
  waitAfter: number;
}

/** An instant of a day, in hundredths of a minute since the bench opened on it. */
export interface Clock {
  day: Day;
  at: number;
}

const wholeDay = 24 * 60 * 100;

/** The hundredths of a minute that a day still has. */
export function capacityOn(bench: Bench, day: Day): number {
  if (!isWorkday(day)) return 0;
  return Math.max(0, bench.perDay - opensAt(bench, day));
}

/** Where the clock stands when work can go on: what was logged today is gone. */
export const opensAt = (bench: Bench, day: Day): number =>
  day === bench.today ? bench.loggedToday : 0;

/** What the bench has from today up to and including a day, each day worked out once. */
export function capacityOf(bench: Bench): (until: Day) => number {
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

/**
 * When pieces that lie down at an instant may be worked on again. A wait goes on through nights and
 * weekends; what is over while the bench is closed is taken up when it opens.
 */
export function afterWait(bench: Bench, { day, at }: Clock, wait: number): Clock {
  if (wait === 0) return { day, at };
  const end = at + wait;
  const landed = { day: addDays(day, Math.floor(end / wholeDay)), at: end % wholeDay };
  return landed.at <= bench.perDay && isWorkday(landed.day) ? landed : nextOpening(landed.day);
}

function nextOpening(after: Day): Clock {
  let day = addDays(after, 1);
  while (!isWorkday(day)) day = addDays(day, 1);
  return { day, at: 0 };
}
