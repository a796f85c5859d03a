import { InvalidInput } from '../errors/domain-error.ts';
import { type DecimalText, readDecimal } from '../numbers/decimal-text.ts';

/** What a step's seconds are counted per. */
export type PerUnit = 'piece' | 'strike' | 'panel' | 'strip' | 'run';

export const perUnits: readonly PerUnit[] = ['piece', 'strike', 'panel', 'strip', 'run'];

export interface WorkStep {
  name: string;
  setupMinutes: DecimalText;
  secondsPerUnit: DecimalText;
  per: PerUnit;
  /** per cent of the pieces that reach this step and fail at it */
  rejectPercent: DecimalText;
}

/** The work of a run: one figure for all of it, or step by step. */
export type WorkPlan =
  | { kind: 'minutesPer100'; minutes: DecimalText; rejectPercent: DecimalText }
  | { kind: 'steps'; steps: WorkStep[] };

const mostMinutes = 1_000_000;

/**
 * The steps that a ticket shows. One figure of minutes per 100 becomes a single step, 'Make'.
 * @throws InvalidInput
 */
export function ticketSteps(plan: WorkPlan): WorkStep[] {
  checkWorkPlan(plan);
  if (plan.kind === 'steps') return plan.steps;
  const seconds = readDecimal(plan.minutes, 'minutes').times(60).div(100);
  return [
    {
      name: 'Make',
      setupMinutes: '0',
      secondsPerUnit: seconds.toFixed(),
      per: 'piece',
      rejectPercent: plan.rejectPercent,
    },
  ];
}

/** Refuses times below zero, rejects outside 0 to below 100 %, and a plan without steps. @throws InvalidInput */
export function checkWorkPlan(plan: WorkPlan): void {
  if (plan.kind === 'minutesPer100') {
    readDecimal(plan.minutes, 'minutes', { min: 0, max: mostMinutes });
    return checkRejects(plan.rejectPercent, 'rejectPercent');
  }
  if (plan.steps.length === 0) {
    throw new InvalidInput('steps', 'Add at least one step, or give the minutes per 100 pieces.');
  }
  plan.steps.forEach(checkStep);
}

function checkStep(step: WorkStep, at: number): void {
  readDecimal(step.setupMinutes, `steps.${at}.setupMinutes`, { min: 0, max: mostMinutes });
  readDecimal(step.secondsPerUnit, `steps.${at}.secondsPerUnit`, { min: 0, max: mostMinutes });
  checkRejects(step.rejectPercent, `steps.${at}.rejectPercent`);
  if (!perUnits.includes(step.per)) {
    throw new InvalidInput(`steps.${at}.per`, 'Choose piece, strike, panel, strip or run.');
  }
}

function checkRejects(percent: DecimalText, field: string): void {
  if (readDecimal(percent, field, { min: 0, max: 100 }).eq(100)) {
    throw new InvalidInput(
      field,
      'If every piece fails, there is nothing to sell: write less than 100 %.',
    );
  }
}
