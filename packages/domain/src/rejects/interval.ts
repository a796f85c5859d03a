import { InvalidInput } from '../errors/domain-error.ts';
import { betaQuantile } from '../numbers/beta.ts';
import { readWhole } from '../numbers/decimal-text.ts';
import { normalQuantile } from '../numbers/normal.ts';
import { readNumber } from '../numbers/read-number.ts';

export type IntervalMethod = 'wilson' | 'jeffreys';

export interface IntervalInput {
  good: number;
  /** pieces made, 1 to 10^9 */
  total: number;
  /** chance that the interval holds the true share, above 0 and below 1 */
  confidence: number;
  method: IntervalMethod;
}

/** Both shares from 0 to 1. */
export interface Interval {
  low: number;
  high: number;
}

const mostPieces = 1_000_000_000;

/**
 * Between which two shares the true share of good pieces lies, from `good` out of `total`; two-sided.
 * `wilson` is the score interval (Wilson 1927); `jeffreys` has equal tails of
 * Beta(good + 1/2, failed + 1/2) and starts at 0 where none was good, ends at 1 where all were
 * (Brown, Cai and DasGupta, Statistical Science 16, 2001; from memory).
 * @throws InvalidInput
 */
export function goodShareInterval({ good, total, confidence, method }: IntervalInput): Interval {
  readWhole(total, 'total', 1, mostPieces);
  readWhole(good, 'good', 0, mostPieces);
  readNumber(confidence, 'confidence', { above: 0, below: 1 });
  if (good > total) {
    throw new InvalidInput('good', 'No more pieces can be good than were made: check good.');
  }
  const tail = (1 - confidence) / 2;
  const inside = method === 'wilson' ? wilson(good, total, tail) : jeffreys(good, total, tail);
  return { low: good === 0 ? 0 : inside.low, high: good === total ? 1 : inside.high };
}

function wilson(good: number, total: number, tail: number): Interval {
  const z = -normalQuantile(tail);
  const share = good / total;
  const widened = 1 + (z * z) / total;
  const middle = (share + (z * z) / (2 * total)) / widened;
  const spread = (share * (1 - share)) / total + (z * z) / (4 * total * total);
  const half = (z * Math.sqrt(spread)) / widened;
  return { low: middle - half, high: middle + half };
}

/** The upper end is one less the lower end for the failures, so that the two mirror each other. */
function jeffreys(good: number, total: number, tail: number): Interval {
  const [a, b] = [good + 0.5, total - good + 0.5];
  return { low: betaQuantile(tail, a, b), high: 1 - betaQuantile(tail, b, a) };
}
