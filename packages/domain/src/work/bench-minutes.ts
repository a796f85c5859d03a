import type { Decimal } from 'decimal.js';
import {
  type DecimalText,
  Exact,
  readDecimal,
  readWhole,
  toAtMost,
} from '../numbers/decimal-text.ts';
import { learnedTime } from './learning.ts';
import { type Learning, ticketSteps, type WorkPlan, type WorkStep } from './work-plan.ts';

export interface StepMinutes {
  name: string;
  /** pieces, strikes, panels or strips that the step handles on average; 1 for a step per run */
  units: DecimalText;
  /** hands-on minutes, of all who work at it */
  minutes: DecimalText;
}

export interface BenchMinutes {
  total: DecimalText;
  bySteps: StepMinutes[];
}

interface Run {
  /** pieces that are cut */
  pieces: number;
  /** panels or strips that they are cut from */
  containers: number;
  /** allowance for rest on top of all hands-on time, per cent; 0 if left out */
  restPercent?: DecimalText | undefined;
}

/**
 * Hands-on minutes for a run. A step per piece or per strike handles what the steps before it left
 * over on average; minutes are rounded half up to 4 places, per step. Practice shortens the time per
 * piece and per strike where the plan has a learning curve. Standard time = normal time × (1 + rest).
 * @throws InvalidInput
 */
export function benchMinutes(plan: WorkPlan, run: Run): BenchMinutes {
  readWhole(run.pieces, 'pieces');
  readWhole(run.containers, 'containers');
  const practice = practiceFactor(plan.learning, run.pieces);
  const rest = readDecimal(run.restPercent ?? '0', 'restPercent', { min: 0, max: 200 });
  let reaching: Decimal = new Exact(run.pieces);
  let total: Decimal = new Exact(0);
  const bySteps = ticketSteps(plan).map((step) => {
    const units = unitsOf(step, reaching, run.containers);
    const work = workMinutes(step, units, isHandled(step) ? practice : one);
    const minutes = toAtMost(work.times(rest.plus(100)).div(100), 4);
    reaching = reaching.times(shareLeft(step));
    total = total.plus(minutes);
    return { name: step.name, units: toAtMost(units, 2), minutes };
  });
  return { total: toAtMost(total, 4), bySteps };
}

const one = new Exact(1);

const isHandled = ({ per }: WorkStep): boolean => per === 'piece' || per === 'strike';

/**
 * How practice shortens a piece or a strike: average time over the run against the average in the run where it was
 * measured; 1 without a learning curve.
 * @param pieces that are cut
 */
export function practiceFactor(learning: Learning | null | undefined, pieces: number): Decimal {
  if (!learning || pieces === 0) return one;
  const curve = Number(learning.curvePercent) / 100;
  const average = (n: number) => learnedTime(learning.model, curve, n).average;
  // Six digits: what a floating point number has for certain, so that every machine agrees.
  return new Exact((average(pieces) / average(learning.measuredAt)).toPrecision(6));
}

function unitsOf(step: WorkStep, reaching: Decimal, containers: number): Decimal {
  if (isHandled(step)) return reaching;
  return new Exact(step.per === 'run' ? 1 : containers);
}

function workMinutes(step: WorkStep, units: Decimal, practice: Decimal): Decimal {
  const running = units.times(step.secondsPerUnit).times(practice).div(60);
  const attended = step.unattended ? new Exact(0) : running;
  return attended.plus(step.setupMinutes).times(step.people ?? 1);
}

const shareLeft = (step: WorkStep): Decimal =>
  new Exact(100).minus(readDecimal(step.rejectPercent, 'rejectPercent')).div(100);

/**
 * The share of pieces that come through all steps as good ones, seconds not among them; above 0 and
 * up to 1.
 * @throws InvalidInput
 */
export function goodShare(plan: WorkPlan): number {
  const whole = new Exact(100).minus(plan.secondsPercent ?? '0').div(100);
  return ticketSteps(plan)
    .reduce((share, step) => share.times(shareLeft(step)), whole)
    .toNumber();
}

/**
 * The share of pieces that fail at one step or another, seconds not among them; 0 up to below 1.
 * @throws InvalidInput
 */
export function rejectShare(plan: WorkPlan): number {
  return one.minus(sharesReaching(plan).at(-1) ?? one).toNumber();
}

/**
 * The share of the pieces cut that reaches each step, by its place in the plan; the last entry is
 * what leaves the last step.
 * @throws InvalidInput
 */
export function sharesReaching(plan: WorkPlan): Decimal[] {
  const shares: Decimal[] = [one];
  for (const step of ticketSteps(plan)) {
    shares.push((shares.at(-1) as Decimal).times(shareLeft(step)));
  }
  return shares;
}
