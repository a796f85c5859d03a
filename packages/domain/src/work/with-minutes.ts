import { type DecimalText, Exact, readDecimal, toAtMost } from '../numbers/decimal-text.ts';
import type { WorkPlan } from './work-plan.ts';

/**
 * The work with all its times at so many per cent of what they are: setting up and seconds alike, to
 * eight decimals.
 * @throws InvalidInput
 */
export function withMinutes(plan: WorkPlan, percent: DecimalText): WorkPlan {
  const share = readDecimal(percent, 'minutes', { min: 0, max: 10_000 }).div(100);
  const times = (value: DecimalText) => toAtMost(new Exact(value).times(share), 8);
  if (plan.kind === 'minutesPer100') return { ...plan, minutes: times(plan.minutes) };
  const steps = plan.steps.map((step) => ({
    ...step,
    setupMinutes: times(step.setupMinutes),
    secondsPerUnit: times(step.secondsPerUnit),
  }));
  return { ...plan, steps };
}
