import { readWhole } from '../numbers/decimal-text.ts';
import { betaBelow } from '../numbers/beta.ts';
import { readNumber } from '../numbers/read-number.ts';

/**
 * The chance that at least `good` of `pieces` come out good: P(X ≥ good) for binomial X, as the
 * incomplete beta function I_rate(good, pieces − good + 1). It says what a plain allowance risks.
 * @param rate the share that comes out good, above 0 and up to 1
 * @throws InvalidInput
 */
export function chanceOfEnough(pieces: number, good: number, rate: number): number {
  readWhole(pieces, 'pieces', 1, 1_000_000_000);
  readWhole(good, 'good', 1, 1_000_000_000);
  readNumber(rate, 'rate', { above: 0, max: 1 });
  return good > pieces ? 0 : betaBelow(rate, good, pieces - good + 1);
}
