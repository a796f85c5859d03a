import type { Decimal } from 'decimal.js';
import {
  type DecimalText,
  Exact,
  readDecimal,
  readWhole,
  toAtMost,
} from '../numbers/decimal-text.ts';

/** What one run logged on a step. */
export interface LoggedStep {
  minutes: DecimalText;
  /** pieces, strikes, panels or strips that were handled, 1 or more; 1 for a step per run */
  units: number;
  /** how practice shortened a unit in a run of its size; 1 if left out */
  practice?: Decimal | undefined;
}

/** A step as it is said. */
interface SaidStep extends StepTime {
  /** hands on it at once; 1 if left out */
  people?: number | undefined;
  /** nobody stands by while its seconds run */
  unattended?: boolean | undefined;
}

interface StepTime {
  setupMinutes: DecimalText;
  secondsPerUnit: DecimalText;
}

/** What several runs say of a step. */
export interface PooledStepTime extends StepTime {
  units: number;
  runs: number;
}

/**
 * Setup and seconds of a step from what several runs logged on it. A log does not tell setup from
 * work, so the setup that was said stays and the seconds are what the logged minutes leave:
 * 60 (Σ minutes − n · setup) / Σ units · practice. Where the setups alone would be more than was logged, both
 * shrink alike. Of a step that runs unattended only the setup is logged, and its seconds stay. What was logged is
 * of all hands, with their rest in it: what is learned is of one, without. Null where nothing was logged.
 * @param restPercent the allowance for rest that an estimate adds, per cent
 * @throws InvalidInput
 */
export function poolStepTime(
  said: SaidStep,
  logged: readonly LoggedStep[],
  restPercent: DecimalText = '0',
): PooledStepTime | null {
  if (logged.length === 0) return null;
  const rest = readDecimal(restPercent, 'restPercent', { min: 0, max: 200 });
  const perHand = rest
    .plus(100)
    .div(100)
    .times(said.people ?? 1);
  const setup = readDecimal(said.setupMinutes, 'setupMinutes', { min: 0 });
  const seconds = readDecimal(said.secondsPerUnit, 'secondsPerUnit', { min: 0 });
  const runs = logged.length;
  let [minutes, units, practised] = [new Exact(0) as Decimal, 0, new Exact(0) as Decimal];
  logged.forEach((run, at) => {
    const worked = readDecimal(run.minutes, `logged.${at}.minutes`, { min: 0 });
    minutes = minutes.plus(worked.div(perHand));
    units += readWhole(run.units, `logged.${at}.units`, 1);
    practised = practised.plus((run.practice ?? new Exact(1)).times(run.units));
  });
  if (said.unattended === true) return { ...timeOf(minutes.div(runs), seconds), units, runs };
  const left = minutes.minus(setup.times(runs));
  if (left.gt(0) || setup.isZero()) {
    return { ...timeOf(setup, left.times(60).div(practised)), units, runs };
  }
  const thought = setup.times(runs).plus(seconds.times(practised).div(60));
  const share = minutes.div(thought);
  return { ...timeOf(setup.times(share), seconds.times(share)), units, runs };
}

const timeOf = (setup: Decimal, seconds: Decimal): StepTime => ({
  setupMinutes: toAtMost(setup, 2),
  secondsPerUnit: toAtMost(seconds, 2),
});
