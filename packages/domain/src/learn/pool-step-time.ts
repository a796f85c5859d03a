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
 * 60 (Σ minutes − n · setup) / Σ units. Where the setups alone would be more than was logged, both
 * shrink alike. Null where nothing was logged.
 * @throws InvalidInput
 */
export function poolStepTime(said: StepTime, logged: readonly LoggedStep[]): PooledStepTime | null {
  if (logged.length === 0) return null;
  const setup = readDecimal(said.setupMinutes, 'setupMinutes', { min: 0 });
  const seconds = readDecimal(said.secondsPerUnit, 'secondsPerUnit', { min: 0 });
  const runs = logged.length;
  let [minutes, units] = [new Exact(0) as Decimal, 0];
  logged.forEach((run, at) => {
    minutes = minutes.plus(readDecimal(run.minutes, `logged.${at}.minutes`, { min: 0 }));
    units += readWhole(run.units, `logged.${at}.units`, 1);
  });
  const left = minutes.minus(setup.times(runs));
  if (left.gt(0) || setup.isZero()) {
    return { ...timeOf(setup, left.times(60).div(units)), units, runs };
  }
  const thought = setup.times(runs).plus(seconds.times(units).div(60));
  const share = minutes.div(thought);
  return { ...timeOf(setup.times(share), seconds.times(share)), units, runs };
}

const timeOf = (setup: Decimal, seconds: Decimal): StepTime => ({
  setupMinutes: toAtMost(setup, 2),
  secondsPerUnit: toAtMost(seconds, 2),
});
