import { type DecimalText, readDecimal, toText } from '../numbers/decimal-text.ts';
import type { WorkPlan } from './work-plan.ts';

/**
 * The work with one figure of rejects in place of its own, in per cent. Where each step has rejects,
 * all are counted at the last one, so that nothing is bought too little for the pieces that get far.
 * @throws InvalidInput
 */
export function withRejects(plan: WorkPlan, percent: DecimalText): WorkPlan {
  const rejectPercent = toText(readDecimal(percent, 'rejectPercent', { min: 0, max: 100 }));
  if (plan.kind === 'minutesPer100') return { ...plan, rejectPercent };
  const last = plan.steps.length - 1;
  const steps = plan.steps.map((step, at) => ({
    ...step,
    rejectPercent: at === last ? rejectPercent : '0',
  }));
  return { ...plan, steps };
}
