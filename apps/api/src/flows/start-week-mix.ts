import type { KindOfWorkTyped, WeekStart } from '@hidewright/contract';
import { daysBetween, type RunInput, type RunNumbers } from '@hidewright/domain';
import { Decimal } from 'decimal.js';
import { moneyText } from '../http/decimal-text.ts';
import { Workshop } from '../modules/workshop/workshop.entity.ts';
import { rungsOf } from '../modules/quotes/quote-numbers.ts';
import type { Work } from '../work.ts';

/** How far back runs still say how often they come. */
const mostWeeks = 26;
/** A shop that has only begun is not judged by its first days. */
const leastWeeks = 4;
const workdays = 5;
const mostKinds = 40;

/**
 * What a week's mix can begin with: the shop's bench hours and the desk time of its orders as they came lately; what
 * the target asks of those hours; and for each pattern the middle of its finished runs: minutes as logged, what was
 * left as quoted (as in An hour earned), and how many came a week.
 */
export async function weekToStartWith(work: Work): Promise<WeekStart> {
  const workshop = await work.em.findOneOrFail(Workshop, 1);
  const runs = (await finishedRuns(work)).flatMap(readRun);
  const weeks = weeksOf(runs, work.today);
  const benchHours = workshop.benchHoursPerDay.times(workdays);
  const deskMinutes = runs.reduce((sum, run) => sum.plus(run.deskMinutes), new Decimal(0));
  return {
    week: {
      hoursPerWeek: benchHours.plus(deskMinutes.div(60).div(weeks)).toDP(1).toString(),
      deskHoursPerWeek: '0',
      incomeNeeded: moneyText(benchHours.times(workshop.targetPerHour)),
      kinds: [...byPattern(runs).values()].slice(0, mostKinds).map((of) => kindOf(of, weeks)),
    },
    wagePerHour: moneyText(workshop.wagePerHour),
    from: { runs: runs.length, weeks },
  };
}

interface Row {
  patternName: string;
  finishedOn: string;
  quantity: number;
  input: string;
  numbers: string;
  optionName: string | null;
  minutes: number;
}

const finished = `SELECT p.name AS patternName, substr(j.finished_at, 1, 10) AS finishedOn, o.quantity, o.option_name AS optionName, q.input,
    q.numbers,
    (SELECT COALESCE(SUM(minutes), 0) FROM job_step WHERE job_id = j.id) AS minutes
  FROM job j JOIN customer_order o ON o.id = j.order_id JOIN quote q ON q.id = o.quote_id
    JOIN pattern_version v ON v.id = j.pattern_version_id JOIN pattern p ON p.id = v.pattern_id
  WHERE j.state = 'finished' AND o.state <> 'cancelled' AND p.active = 1 AND j.finished_at >= date(?, ?)
  ORDER BY j.finished_at DESC`;

const finishedRuns = ({ em, today }: Work): Promise<Row[]> =>
  em.execute<Row[]>(finished, [today, `-${mostWeeks * 7} days`]);

interface FinishedRun {
  patternName: string;
  finishedOn: string;
  benchMinutes: Decimal;
  deskMinutes: Decimal;
  left: Decimal;
}

/** A run without logged minutes says nothing of an hour. */
function readRun(row: Row): FinishedRun[] {
  const rungs = rungsOf(JSON.parse(row.numbers) as RunNumbers, row.optionName);
  const rung = rungs.find(({ quantity }) => quantity === row.quantity);
  if (rung === undefined || row.minutes <= 0) return [];
  const { deskMinutesPerOrder } = JSON.parse(row.input) as RunInput;
  return [
    {
      patternName: row.patternName,
      finishedOn: row.finishedOn,
      benchMinutes: new Decimal(row.minutes).div(100),
      deskMinutes: new Decimal(deskMinutesPerOrder),
      left: new Decimal(rung.left),
    },
  ];
}

/** From the first of the runs until today. */
function weeksOf(runs: readonly FinishedRun[], today: string): number {
  const first = runs.at(-1)?.finishedOn ?? today;
  return Math.min(mostWeeks, Math.max(leastWeeks, Math.ceil(daysBetween(first, today) / 7)));
}

function byPattern(runs: readonly FinishedRun[]): Map<string, FinishedRun[]> {
  const found = new Map<string, FinishedRun[]>();
  for (const run of runs) {
    found.set(run.patternName, [...(found.get(run.patternName) ?? []), run]);
  }
  return found;
}

function kindOf(runs: readonly FinishedRun[], weeks: number): KindOfWorkTyped {
  const mean = (field: 'benchMinutes' | 'deskMinutes' | 'left') =>
    runs.reduce((sum, run) => sum.plus(run[field]), new Decimal(0)).div(runs.length);
  return {
    name: runs[0]?.patternName ?? '',
    kind: 'run',
    benchMinutes: mean('benchMinutes').toDP(0).toString(),
    deskMinutes: mean('deskMinutes').toDP(0).toString(),
    left: moneyText(mean('left')),
    mostPerWeek: new Decimal(runs.length).div(weeks).toDP(2).toString(),
    leastPerWeek: '0',
  };
}
