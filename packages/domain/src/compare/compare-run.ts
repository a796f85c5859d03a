import type { Decimal } from 'decimal.js';
import { InvalidInput } from '../errors/domain-error.ts';
import {
  type DecimalText,
  Exact,
  readDecimal,
  readWhole,
  toAtMost,
} from '../numbers/decimal-text.ts';

/** What was said of a run when it was quoted. */
export interface RunEstimate {
  cut: number;
  /** pieces ordered */
  good: number;
  minutes: DecimalText;
  leatherAreaMm2: DecimalText;
  /** per cent of the pieces cut */
  rejectPercent: DecimalText;
}

/** What was counted at the bench. */
export interface RunFact {
  cut: number;
  good: number;
  rejects: number;
  seconds: number;
  minutes: DecimalText;
  leatherAreaMm2: DecimalText;
}

export type CompareName = 'minutes per 100' | 'minutes' | 'cut' | 'good' | 'rejects' | 'leather';

export interface CompareRow {
  name: CompareName;
  said: DecimalText;
  was: DecimalText;
  unit: 'minutes' | 'pieces' | 'percent' | 'mm2';
  /** by how many per cent of what was said the fact lies above it; null where nothing was said */
  overPercent: DecimalText | null;
}

/**
 * Estimate and fact side by side. Minutes per 100 count the pieces cut. Rejects are per cent of the
 * pieces cut; seconds count as made, not as rejects.
 * @throws InvalidInput
 */
export function compareRun({
  estimate,
  fact,
}: {
  estimate: RunEstimate;
  fact: RunFact;
}): CompareRow[] {
  checkFact(fact);
  const whole = (value: number) => new Exact(value);
  return [
    row('minutes per 100', per100(estimate), per100(fact), 'minutes', 2),
    row('minutes', new Exact(estimate.minutes), new Exact(fact.minutes), 'minutes', 1),
    row('cut', whole(estimate.cut), whole(fact.cut), 'pieces', 0),
    row('good', whole(estimate.good), whole(fact.good), 'pieces', 0),
    row('rejects', new Exact(estimate.rejectPercent), rejectShare(fact), 'percent', 2),
    row('leather', new Exact(estimate.leatherAreaMm2), new Exact(fact.leatherAreaMm2), 'mm2', 3),
  ];
}

function checkFact(fact: RunFact): void {
  readWhole(fact.cut, 'cut');
  readWhole(fact.good, 'good');
  readWhole(fact.rejects, 'rejects');
  readWhole(fact.seconds, 'seconds');
  readDecimal(fact.minutes, 'minutes', { min: 0 });
  readDecimal(fact.leatherAreaMm2, 'leatherAreaMm2', { min: 0 });
  if (fact.good + fact.rejects + fact.seconds > fact.cut) {
    throw new InvalidInput('cut', 'More pieces were counted than were cut: correct the counts.');
  }
}

const per100 = ({ minutes, cut }: { minutes: DecimalText; cut: number }): Decimal =>
  cut === 0 ? new Exact(0) : new Exact(minutes).times(100).div(cut);

const rejectShare = ({ rejects, cut }: RunFact): Decimal =>
  cut === 0 ? new Exact(0) : new Exact(rejects).times(100).div(cut);

function row(
  name: CompareName,
  said: Decimal,
  was: Decimal,
  unit: CompareRow['unit'],
  places: number,
): CompareRow {
  const over = said.isZero() ? null : toAtMost(was.minus(said).div(said).times(100), 1);
  return {
    name,
    said: toAtMost(said, places),
    was: toAtMost(was, places),
    unit,
    overPercent: over,
  };
}
