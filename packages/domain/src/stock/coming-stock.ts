import { addDays, type Day } from '../promise/day.ts';
import { readNumber } from '../numbers/read-number.ts';
import { comingWeeks, type Change, type ComingDay } from './coming-weeks.ts';
import type { Dated } from './promise-pool.ts';

export interface ComingInput {
  /** on hand and held for nobody, 0 or more; pieces, or mm² */
  free: number;
  /** held for jobs, 0 or more: what is expected to be used comes out of it first */
  reserved: number;
  receipts: readonly Dated[];
  promised: readonly Dated[];
  /** expected use of one day, 0 or more */
  daily: number;
  minimum: number;
  today: Day;
}

export interface ComingStock {
  /** one row a week, and each day on which a paper brings or takes something */
  days: ComingDay[];
  runsOutOn: Day | null;
  belowMinimumOn: Day | null;
}

const horizonDays = 84;

/**
 * How an item goes on over twelve weeks: what is ordered comes, what is promised goes, and so does
 * what is usually used, as far as it is neither held nor promised already. Whole pieces or mm².
 * @throws InvalidInput
 */
export function comingStock(input: ComingInput): ComingStock {
  const { free, receipts, promised, minimum, today } = input;
  const { days, runsOutOn } = comingWeeks(
    readNumber(free, 'free', { min: 0 }),
    [
      ...receipts.map((each) => change(each, 1)),
      ...promised.map((each) => change(each, -1)),
    ].concat(usualUse(input)),
    today,
  );
  const belowMinimumOn =
    free < minimum ? today : (days.find(({ left }) => left < minimum)?.day ?? null);
  const turns = [runsOutOn, belowMinimumOn];
  return { days: rowsOf(days, today, turns), runsOutOn, belowMinimumOn };
}

const change = ({ day, quantity, paper = '' }: Dated, sign: 1 | -1): Change => ({
  day,
  quantity: sign * quantity,
  what: paper,
});

/** Day by day, what is expected beyond what is held and promised. */
function usualUse({ daily, reserved, promised, today }: ComingInput): Change[] {
  readNumber(daily, 'daily', { min: 0 });
  let sofar = 0;
  return Array.from({ length: horizonDays }, (_, at) => {
    const day = addDays(today, at + 1);
    const covered = promised
      .filter((each) => each.day <= day)
      .reduce((sum, { quantity }) => sum + quantity, reserved);
    const all = Math.max(sofar, Math.round(daily * (at + 1) - covered));
    const quantity = -(all - sofar);
    sofar = all;
    return { day, quantity, what: '' };
  });
}

/** Adds quiet days to the next row. */
function rowsOf(days: readonly ComingDay[], today: Day, turns: readonly (Day | null)[]) {
  const weeks = new Set(Array.from({ length: 12 }, (_, at) => addDays(today, (at + 1) * 7)));
  const rows: ComingDay[] = [];
  let [comes, goes] = [0, 0];
  for (const each of days) {
    comes += each.comes;
    goes += each.goes;
    const what = each.what.filter((word) => word !== '');
    if (what.length === 0 && !weeks.has(each.day) && !turns.includes(each.day)) continue;
    rows.push({ ...each, comes, goes, what });
    [comes, goes] = [0, 0];
  }
  return rows;
}
