import type { Decimal } from 'decimal.js';
import { type DecimalText, Exact, toAtMost, toPlaces } from '../numbers/decimal-text.ts';
import type { LinearProgramme, LinearSolver } from './linear-programme.ts';
import { type ReadKind, type ReadWeek, readWeek } from './read-week.ts';
import type { MixedKind, Week, WeekIncome, WeekMix } from './week.ts';

/**
 * The mix of a week's work that leaves most: units of each kind, in fractions, between what is promised
 * and what can be sold, within the hours that remain when the desk time of no order is off. An order's
 * own desk time is part of what it takes. What one more hour is worth is the dual value of the hours,
 * or what a whole hour more would really bring where that is less.
 * @param solve a solver of linear programmes
 * @throws InvalidInput naming the field, with what to change
 */
export function weekMix(week: Week, solve: LinearSolver): WeekMix {
  const read = readWeek(week);
  const best = mostLeft(read, read.hours, solve);
  const kinds = read.kinds.map((kind, at) => mixed(kind, best.units[at] as Decimal));
  const left = sumOf(kinds.map((kind) => new Exact(kind.left)));
  const used = hoursOf(read.kinds, best.units);
  const atWork = used.plus(read.deskFirst);
  const income = incomeOf(read, left, solve);
  return {
    kinds,
    hours: {
      all: hoursText(read.allHours),
      deskFirst: hoursText(read.deskFirst),
      free: hoursText(Exact.max(0, read.hours.minus(used))),
    },
    left: toPlaces(left, 2),
    averagePerHour: used.isZero() ? null : toPlaces(left.div(atWork), 2),
    oneMoreHour: oneMoreHour(read, best, solve),
    income,
    largePieces: {
      hours: hoursText(hoursOf(read.kinds, best.units, 'large piece')),
      atMost: income.reached ? mostForLargePieces(read, best.units, solve) : null,
    },
  };
}

interface Best {
  units: Decimal[];
  left: number;
  perHour: number;
}

function mostLeft(read: ReadWeek, hours: Decimal, solve: LinearSolver): Best {
  const gain = read.kinds.map(({ left }) => left.toNumber());
  const answer = solve(programme(read, gain, [hoursRow(read, hours)]));
  // What is promised has been found to fit, and hours bound the rest.
  if (answer === null) throw new Error('The solver finds no mix where there is one.');
  const left = answer.x.reduce((sum, units, at) => sum + units * (gain[at] ?? 0), 0);
  return { units: answer.x.map(steady), left, perHour: answer.duals[0] ?? 0 };
}

function oneMoreHour(read: ReadWeek, best: Best, solve: LinearSolver): WeekMix['oneMoreHour'] {
  const more = mostLeft(read, read.hours.plus(1), solve);
  const worth = Math.max(0, Math.min(best.perHour, more.left - best.left));
  const into = read.kinds.flatMap(({ name }, at) =>
    more.units[at]?.gt(best.units[at] ?? 0) ? [name] : [],
  );
  const left = toPlaces(new Exact(worth), 2);
  return { left, into: left === '0.00' ? [] : into };
}

/** Whether the income is reached, and if not, which hours would reach it: the fewest, hours unlimited. */
function incomeOf(read: ReadWeek, left: Decimal, solve: LinearSolver): WeekIncome {
  const short = read.incomeNeeded.minus(left);
  const needed = toPlaces(read.incomeNeeded, 2);
  if (short.lte(0)) return { needed, reached: true, short: '0.00', hoursShort: null };
  const fewest = read.kinds.map(({ hours }) => -hours.toNumber());
  const answer = solve(programme(read, fewest, [incomeRow(read)]));
  const more = answer && hoursOf(read.kinds, answer.x.map(steady)).minus(read.hours);
  return {
    needed,
    reached: false,
    short: toPlaces(short, 2),
    hoursShort: more === null ? null : hoursText(Exact.max(0.01, more)),
  };
}

/** All hours but the fewest for runs with which the income is still reached. */
function mostForLargePieces(
  read: ReadWeek,
  best: readonly Decimal[],
  solve: LinearSolver,
): DecimalText {
  const fewest = read.kinds.map(({ kind, hours }) => (kind === 'run' ? -hours.toNumber() : 0));
  const answer = solve(programme(read, fewest, [hoursRow(read, read.hours), incomeRow(read)]));
  const units = answer?.x.map(steady) ?? best;
  return hoursText(Exact.max(0, read.hours.minus(hoursOf(read.kinds, units, 'run'))));
}

function programme(
  { kinds }: ReadWeek,
  gain: readonly number[],
  rows: LinearProgramme['rows'],
): LinearProgramme {
  const bounds = kinds.map(({ least, most }) => ({
    least: least.toNumber(),
    most: most?.toNumber() ?? null,
  }));
  return { gain, bounds, rows };
}

const hoursRow = ({ kinds }: ReadWeek, hours: Decimal) => ({
  of: kinds.map((kind) => kind.hours.toNumber()),
  least: null,
  most: hours.toNumber(),
});

const incomeRow = ({ kinds, incomeNeeded }: ReadWeek) => ({
  of: kinds.map(({ left }) => left.toNumber()),
  least: incomeNeeded.toNumber(),
  most: null,
});

/** A millionth of a unit is the solver's rounding, not work. */
const steady = (units: number): Decimal => new Exact(Math.max(0, units)).toDP(6);

function mixed(kind: ReadKind, units: Decimal): MixedKind {
  const free = kind.most === null || kind.most.gt(kind.least);
  return {
    name: kind.name,
    kind: kind.kind,
    units: toAtMost(units, 2),
    benchHours: hoursText(kind.benchHours.times(units)),
    deskHours: hoursText(kind.deskHours.times(units)),
    left: toPlaces(kind.left.times(units), 2),
    leftPerHour: toPlaces(kind.left.div(kind.hours), 2),
    at: kind.most?.lte(units) ? 'most' : free && units.lte(kind.least) ? 'least' : null,
  };
}

function hoursOf(
  kinds: readonly ReadKind[],
  units: readonly Decimal[],
  only?: ReadKind['kind'],
): Decimal {
  return sumOf(
    kinds.map(({ kind, hours }, at) =>
      only === undefined || kind === only ? hours.times(units[at] ?? 0) : new Exact(0),
    ),
  );
}

const sumOf = (all: readonly Decimal[]): Decimal =>
  all.reduce((sum, each) => sum.plus(each), new Exact(0));

const hoursText = (hours: Decimal): DecimalText => toAtMost(hours, 2);
