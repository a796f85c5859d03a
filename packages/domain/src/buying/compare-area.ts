import { type DecimalText, Exact, readDecimal, toAtMost, toText } from '../numbers/decimal-text.ts';

export interface AreaComparison {
  /** measured less marked: below 0 where it is short of its mark */
  differenceMm2: DecimalText;
  /** the same in per cent of the mark, to a hundredth */
  percent: DecimalText;
  /** short by more than the tolerance */
  short: boolean;
}

/**
 * The area that was measured here against the one that the tannery marked on it. It is short where
 * it misses more than `tolerancePercent` of its mark; exactly the tolerance still passes, and more
 * than was marked is never short. Which tolerance is fair is the shop's to say: measuring by hand
 * and by machine differ by a few per cent (common practice, no source).
 * @param markedMm2 above 0
 * @param measuredMm2 above 0
 * @param tolerancePercent 0 to 100
 * @throws InvalidInput
 */
export function compareArea(
  markedMm2: DecimalText,
  measuredMm2: DecimalText,
  tolerancePercent: DecimalText,
): AreaComparison {
  const marked = readDecimal(markedMm2, 'markedMm2', { min: '0.001' });
  const measured = readDecimal(measuredMm2, 'measuredMm2', { min: '0.001' });
  const tolerance = readDecimal(tolerancePercent, 'tolerancePercent', { min: 0, max: 100 });
  const difference = measured.minus(marked);
  const missing = Exact.max(0, difference.negated());
  return {
    differenceMm2: toText(difference),
    percent: toAtMost(difference.times(100).div(marked), 2),
    short: missing.times(100).gt(tolerance.times(marked)),
  };
}
