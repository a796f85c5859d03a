import type { Day } from '../promise/day.ts';

/** Something that comes to or goes from an item on a day. */
export interface Change {
  day: Day;
  /** above 0 comes, below 0 goes */
  quantity: number;
  /** what for: P-0007, O-0012 Heron tags */
  what: string;
}

export interface ComingDay {
  day: Day;
  comes: number;
  goes: number;
  /** what would be there and held for nobody at the end of it; below 0 where it does not suffice */
  left: number;
  what: string[];
}

export interface ComingWeeks {
  days: ComingDay[];
  /** the first day on which it does not suffice; null where it does */
  runsOutOn: Day | null;
}

/**
 * How an item goes on when all that is expected comes and all that is promised goes.
 * @param free what is on hand and held for nobody today
 */
export function comingWeeks(free: number, changes: readonly Change[], today: Day): ComingWeeks {
  let left = free;
  const dated = changes.map((change) => (change.day < today ? { ...change, day: today } : change));
  const days = [...new Set(dated.map(({ day }) => day))].sort().map((day) => {
    const own = dated.filter((change) => change.day === day);
    const sum = (sign: 1 | -1) =>
      own.reduce((total, { quantity }) => total + Math.max(0, sign * quantity), 0);
    const [comes, goes] = [sum(1), sum(-1)];
    left += comes - goes;
    return { day, comes, goes, left, what: own.map(({ what }) => what) };
  });
  return { days, runsOutOn: days.find((each) => each.left < 0)?.day ?? null };
}
