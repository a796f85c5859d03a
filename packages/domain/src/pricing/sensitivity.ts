import type { RunInput } from '../costing/run-input.ts';
import { type DecimalText, Exact, toText } from '../numbers/decimal-text.ts';
import { withMinutes } from '../work/with-minutes.ts';
import type { WorkPlan } from '../work/work-plan.ts';
import { priceRun } from './price-run.ts';
import type { BreakNumbers } from './run-numbers.ts';

type Shaken = 'rejects' | 'minutes' | 'leather price';

interface Hourly {
  perBenchHour: DecimalText;
  perHourAllIn: DecimalText;
}

/** What happens per hour where one thing turns out better and worse, at an unchanged price. */
export interface Shake {
  what: Shaken;
  /** with so much less of it */
  less: Hourly;
  /** with so much more of it */
  more: Hourly;
}

/**
 * Each of rejects, minutes and leather price by some per cent less and more, the price held.
 * @param byPercent above 0, below 100; 20 is usual
 * @throws InvalidInput · NotWorkable
 */
export function shakeRun(input: RunInput, at: BreakNumbers, byPercent: number): Shake[] {
  const held = {
    ...input,
    options: [],
    breaks: [{ quantity: at.quantity, typedPrice: at.priceEach }],
  };
  const all: Shaken[] = ['rejects', 'minutes', 'leather price'];
  return all.map((what) => ({
    what,
    less: hourly(shaken(held, what, 100 - byPercent)),
    more: hourly(shaken(held, what, 100 + byPercent)),
  }));
}

function hourly(input: RunInput): Hourly {
  const { perBenchHour, perHourAllIn } = priceRun(input).breaks[0] as BreakNumbers;
  return { perBenchHour, perHourAllIn };
}

function shaken(input: RunInput, what: Shaken, toPercent: number): RunInput {
  const times = (value: DecimalText) => toText(new Exact(value).times(toPercent).div(100));
  if (what === 'leather price') {
    const pricePerFt2 = new Exact(times(input.leather.pricePerFt2)).toDecimalPlaces(4).toFixed();
    return { ...input, leather: { ...input.leather, pricePerFt2 } };
  }
  if (what === 'minutes') return { ...input, work: withMinutes(input.work, String(toPercent)) };
  const rejects = (value: DecimalText) => Exact.min(99, times(value)).toFixed();
  return {
    ...input,
    work: rejectsWork(input.work, rejects),
    history: input.history && shakenHistory(input.history, toPercent),
  };
}

function rejectsWork(work: WorkPlan, times: (value: DecimalText) => DecimalText): WorkPlan {
  if (work.kind === 'minutesPer100') return { ...work, rejectPercent: times(work.rejectPercent) };
  const steps = work.steps.map((step) => ({ ...step, rejectPercent: times(step.rejectPercent) }));
  return { ...work, steps };
}

/** As many pieces behind it, with so many more or fewer failures among them. */
function shakenHistory({ good, total }: { good: number; total: number }, toPercent: number) {
  const failed = Math.min(total - 1, Math.round(((total - good) * toPercent) / 100));
  return { good: total - failed, total };
}
