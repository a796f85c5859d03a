import type { Decimal } from 'decimal.js';
import { InvalidInput } from '../errors/domain-error.ts';
import { Exact, type Limits, readDecimal, toAtMost, toText } from '../numbers/decimal-text.ts';
import type { KindOfWork, Week } from './week.ts';

/** A kind of work in numbers: hours of one unit, and how many a week. */
export interface ReadKind {
  name: string;
  kind: KindOfWork['kind'];
  benchHours: Decimal;
  deskHours: Decimal;
  hours: Decimal;
  left: Decimal;
  least: Decimal;
  most: Decimal | null;
}

export interface ReadWeek {
  allHours: Decimal;
  deskFirst: Decimal;
  /** for orders: what remains when the desk time of no order is off */
  hours: Decimal;
  incomeNeeded: Decimal;
  kinds: ReadKind[];
}

/** @throws InvalidInput naming the field, with what to change; also where more is promised than there are hours for */
export function readWeek(week: Week): ReadWeek {
  const allHours = readDecimal(week.hoursPerWeek, 'hoursPerWeek', { min: 0.01, max: 100_000 });
  const deskFirst = readDecimal(week.deskHoursPerWeek, 'deskHoursPerWeek', { min: 0 });
  const hours = allHours.minus(deskFirst);
  if (hours.lte(0)) {
    throw new InvalidInput(
      'deskHoursPerWeek',
      `Of ${hoursWords(allHours)} a week, ${hoursWords(deskFirst)} at the desk leave none for the bench. Enter fewer desk hours.`,
    );
  }
  if (week.kinds.length === 0) throw new InvalidInput('kinds', 'Enter at least one kind of work.');
  const kinds = week.kinds.map(readKind);
  requireRoomForPromised(kinds, hours);
  const incomeNeeded = readDecimal(week.incomeNeeded, 'incomeNeeded', { min: 0, max: 1e12 });
  return { allHours, deskFirst, hours, incomeNeeded, kinds };
}

function readKind(kind: KindOfWork, at: number): ReadKind {
  const read = (field: keyof KindOfWork, limits: Limits) =>
    readDecimal(kind[field], `kinds.${at}.${field}`, limits);
  const bench = read('benchMinutes', { min: 0, max: 1e6 });
  if (bench.isZero()) {
    throw new InvalidInput(`kinds.${at}.benchMinutes`, 'Enter how many minutes it takes, above 0.');
  }
  const least = read('leastPerWeek', { min: 0, max: 1e6 });
  const most = kind.mostPerWeek === null ? null : read('mostPerWeek', { min: 0, max: 1e6 });
  if (most?.lt(least)) {
    throw new InvalidInput(
      `kinds.${at}.leastPerWeek`,
      `More is promised than can be sold: enter ${toText(most)} or less, or raise what can be sold.`,
    );
  }
  const [benchHours, deskHours] = [bench, read('deskMinutes', { min: 0, max: 1e6 })].map((each) =>
    each.div(60),
  ) as [Decimal, Decimal];
  return {
    name: kind.name,
    kind: kind.kind,
    benchHours,
    deskHours,
    hours: benchHours.plus(deskHours),
    left: read('left', { min: -1e12, max: 1e12 }),
    least,
    most,
  };
}

function requireRoomForPromised(kinds: readonly ReadKind[], hours: Decimal): void {
  const promised = kinds.map((kind) => ({ ...kind, takes: kind.least.times(kind.hours) }));
  const all = promised.reduce((sum, { takes }) => sum.plus(takes), new Exact(0));
  if (all.lte(hours)) return;
  const largest = promised.reduce((a, b) => (b.takes.gt(a.takes) ? b : a));
  throw new InvalidInput(
    'hoursPerWeek',
    `What is promised takes ${hoursWords(all)} a week, and ${hoursWords(hours)} are there. Promise less, first of all ${largest.name} (${hoursWords(largest.takes)}), or find ${hoursWords(all.minus(hours))} more.`,
  );
}

/** Rounded so that it never says that nothing is short. */
const hoursWords = (hours: Decimal): string =>
  hours.lt(0.1) ? `${toAtMost(hours.times(60), 1)} min` : `${toAtMost(hours, 1)} h`;
