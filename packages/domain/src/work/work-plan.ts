import { InvalidInput } from '../errors/domain-error.ts';
import { type DecimalText, Exact, readDecimal, readWhole } from '../numbers/decimal-text.ts';
import type { LearningModel } from './learning.ts';

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
  /** hands on it at once, each for all of its time; 1 if left out */
  people?: number | undefined;
  /** nobody stands by while its seconds run, as while a press heats; setting up still takes hands */
  unattended?: boolean | undefined;
  /** how long the pieces must lie before the next step, in minutes: pack bone dry */
  shortestWait?: DecimalText | null | undefined;
  /** how long they may lie at most, in minutes: strike while damp */
  longestWait?: DecimalText | null | undefined;
  /** paid for each unit in place of by the hour */
  pieceRate?: DecimalText | null | undefined;
}

/** How the time of a piece falls with practice within a run. */
export interface Learning {
  model: LearningModel;
  /** share of the time that each doubling leaves, per cent: 90 is a 90 % curve */
  curvePercent: DecimalText;
  /** the size of run in which the entered times were measured, as an average over it */
  measuredAt: number;
}

interface WholePlan {
  /** per cent of the pieces that come out well enough to sell for less */
  secondsPercent?: DecimalText | undefined;
  learning?: Learning | null | undefined;
}

/** The work of a run: one figure for all of it, or step by step. */
export type WorkPlan = WholePlan &
  (
    | { kind: 'minutesPer100'; minutes: DecimalText; rejectPercent: DecimalText }
    | { kind: 'steps'; steps: WorkStep[] }
  );

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

/** How long the pieces must lie after a step, in hundredths of a minute, rounded up; 0 where nothing is said. */
export function waitAfter(step: Pick<WorkStep, 'shortestWait'> | undefined): number {
  return step?.shortestWait ? new Exact(step.shortestWait).times(100).ceil().toNumber() : 0;
}

/** Refuses times below zero, rejects outside 0 to below 100 %, and a plan without steps. @throws InvalidInput */
export function checkWorkPlan(plan: WorkPlan): void {
  if (plan.secondsPercent !== undefined) checkRejects(plan.secondsPercent, 'secondsPercent');
  if (plan.learning) checkLearning(plan.learning);
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
  const field = `steps.${at}`;
  readDecimal(step.setupMinutes, `${field}.setupMinutes`, { min: 0, max: mostMinutes });
  readDecimal(step.secondsPerUnit, `${field}.secondsPerUnit`, { min: 0, max: mostMinutes });
  checkRejects(step.rejectPercent, `${field}.rejectPercent`);
  if (!perUnits.includes(step.per)) {
    throw new InvalidInput(`${field}.per`, 'Choose piece, strike, panel, strip or run.');
  }
  if (step.people !== undefined) readWhole(step.people, `${field}.people`, 1, 20);
  if (step.pieceRate) readDecimal(step.pieceRate, `${field}.pieceRate`, { min: 0, places: 4 });
  checkWaits(step, field);
}

function checkWaits({ shortestWait, longestWait }: WorkStep, field: string): void {
  const limits = { min: 0, max: mostMinutes };
  const shortest = shortestWait ? readDecimal(shortestWait, `${field}.shortestWait`, limits) : null;
  const longest = longestWait ? readDecimal(longestWait, `${field}.longestWait`, limits) : null;
  if (shortest !== null && longest !== null && longest.lt(shortest)) {
    throw new InvalidInput(
      `${field}.longestWait`,
      'The longest wait is shorter than the shortest: write a longer one.',
    );
  }
}

function checkLearning({ curvePercent, measuredAt }: Learning): void {
  const curve = readDecimal(curvePercent, 'learning.curvePercent', { max: 100 });
  if (curve.lte(50)) {
    throw new InvalidInput(
      'learning.curvePercent',
      'Write the learning curve as more than 50 %, up to 100 %: 90 is usual, 100 is no learning.',
    );
  }
  readWhole(measuredAt, 'learning.measuredAt', 1, 100_000);
}

function checkRejects(percent: DecimalText, field: string): void {
  if (readDecimal(percent, field, { min: 0, max: 100 }).eq(100)) {
    throw new InvalidInput(
      field,
      'If every piece fails, there is nothing to sell: write less than 100 %.',
    );
  }
}
