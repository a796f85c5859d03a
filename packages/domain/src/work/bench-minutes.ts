import type { Decimal } from 'decimal.js';
import {
  type DecimalText,
  Exact,
  readDecimal,
  readWhole,
  toAtMost,
} from '../numbers/decimal-text.ts';
import { ticketSteps, type WorkPlan, type WorkStep } from './work-plan.ts';

export interface StepMinutes {
  name: string;
  /** pieces, strikes, panels or strips that the step handles on average; 1 for a step per run */
  units: DecimalText;
  minutes: DecimalText;
}

export interface BenchMinutes {
  total: DecimalText;
  bySteps: StepMinutes[];
}

/**
 * Hands-on minutes for a run. A step per piece or per strike handles what the steps before it left
 * over on average; minutes are rounded half up to 4 places, per step.
 * @param pieces pieces that are cut
 * @param containers panels or strips that they are cut from
 * @throws InvalidInput
 */
export function benchMinutes(
  plan: WorkPlan,
  { pieces, containers }: { pieces: number; containers: number },
): BenchMinutes {
  readWhole(pieces, 'pieces');
  readWhole(containers, 'containers');
  let reaching: Decimal = new Exact(pieces);
  let total: Decimal = new Exact(0);
  const bySteps = ticketSteps(plan).map((step) => {
    const units = unitsOf(step, reaching, containers);
    const minutes = toAtMost(minutesOf(step, units), 4);
    reaching = reaching.times(shareLeft(step));
    total = total.plus(minutes);
    return { name: step.name, units: toAtMost(units, 2), minutes };
  });
  return { total: toAtMost(total, 4), bySteps };
}

function unitsOf(step: WorkStep, reaching: Decimal, containers: number): Decimal {
  if (step.per === 'piece' || step.per === 'strike') return reaching;
  return new Exact(step.per === 'run' ? 1 : containers);
}

const minutesOf = (step: WorkStep, units: Decimal): Decimal =>
  units.times(step.secondsPerUnit).div(60).plus(step.setupMinutes);

const shareLeft = (step: WorkStep): Decimal =>
  new Exact(100).minus(readDecimal(step.rejectPercent, 'rejectPercent')).div(100);

/** The share of pieces that come through all steps, above 0 and up to 1. @throws InvalidInput */
export function goodShare(plan: WorkPlan): number {
  return ticketSteps(plan)
    .reduce((share, step) => share.times(shareLeft(step)), new Exact(1))
    .toNumber();
}
