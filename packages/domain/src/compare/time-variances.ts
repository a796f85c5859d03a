import type { Decimal } from 'decimal.js';
import { type DecimalText, Exact, readDecimal, toPlaces } from '../numbers/decimal-text.ts';
import { roundParts } from './round-parts.ts';

/** Minutes of one step. */
export interface StepTimes {
  said: DecimalText;
  /** what was said for as many pieces, panels or strips as the step really handled */
  saidForMade: DecimalText;
  was: DecimalText;
}

interface TimeInput {
  steps: readonly StepTimes[];
  saidWagePerHour: DecimalText;
  /** what was really paid; the said wage where that is not known */
  wasWagePerHour: DecimalText;
  /** wages as the estimate had them, rounded */
  saidCost: DecimalText;
  /** decimals of the currency */
  places: number;
}

/** Why a step cost more (above 0) or less. */
export interface StepVariances {
  /** (actual minutes − said for the pieces made) × said wage */
  time: DecimalText;
  /** (said for the pieces made − said minutes) × said wage */
  made: DecimalText;
  /** (actual wage − said wage) × actual minutes */
  wage: DecimalText;
}

export interface TimeVariances {
  steps: StepVariances[];
  /** what the estimate counted or rounded otherwise */
  other: DecimalText;
  /** actual wages − said wages, both rounded; all parts add up to it exactly */
  sum: DecimalText;
}

/**
 * Splits the difference of a run's wages by step into efficiency (time), pieces made and rate (wage), as
 * standard costing does (from memory).
 * @throws InvalidInput
 */
export function timeVariances(input: TimeInput): TimeVariances {
  const { places } = input;
  const said = readDecimal(input.saidWagePerHour, 'saidWagePerHour', { min: 0 });
  const paid = readDecimal(input.wasWagePerHour, 'wasWagePerHour', { min: 0 });
  const saidCost = readDecimal(input.saidCost, 'saidCost', { places });
  const wasCost = wagesFor(totalOf(input.steps, 'was'), paid).toDecimalPlaces(
    places,
    Exact.ROUND_HALF_UP,
  );
  const exact = input.steps.flatMap((step, at) => partsOf(step, at, said, paid));
  const sum = wasCost.minus(saidCost);
  const other = exact.reduce((left, part) => left.minus(part), sum);
  const rounded = roundParts([...exact, other], places).map((part) => toPlaces(part, places));
  return {
    steps: input.steps.map((_, at) => ({
      time: rounded[3 * at] ?? '0',
      made: rounded[3 * at + 1] ?? '0',
      wage: rounded[3 * at + 2] ?? '0',
    })),
    other: rounded.at(-1) ?? '0',
    sum: toPlaces(sum, places),
  };
}

/** Multiplied before it is divided: a wage per minute seldom ends, and half a cent must stay half a cent. */
const wagesFor = (minutes: Decimal, perHour: Decimal): Decimal => minutes.times(perHour).div(60);

function partsOf(step: StepTimes, at: number, said: Decimal, paid: Decimal): Decimal[] {
  const minutes = (name: keyof StepTimes) =>
    readDecimal(step[name], `steps.${at}.${name}`, { min: 0 });
  return [
    wagesFor(minutes('was').minus(minutes('saidForMade')), said),
    wagesFor(minutes('saidForMade').minus(minutes('said')), said),
    wagesFor(minutes('was'), paid.minus(said)),
  ];
}

const totalOf = (steps: readonly StepTimes[], name: keyof StepTimes): Decimal =>
  steps.reduce((sum, step) => sum.plus(step[name]), new Exact(0) as Decimal);
