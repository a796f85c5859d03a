import type { Decimal } from 'decimal.js';
import {
  type DecimalText,
  Exact,
  readDecimal,
  readWhole,
  toAtMost,
} from '../numbers/decimal-text.ts';

/** What one run took. */
export interface TimedRun {
  /** hands-on minutes that were logged */
  minutes: DecimalText;
  /** pieces that were cut, 1 or more */
  pieces: number;
}

/** The time of several runs taken together. */
export interface PooledMinutes {
  /** minutes for 100 pieces cut, 2 decimals at most */
  per100: DecimalText;
  /** how far the runs lie from it, in the same unit; null for a single run */
  sd: DecimalText | null;
  pieces: number;
  runs: number;
}

/** Minutes for 100 pieces of one run. @throws InvalidInput */
export function minutesPer100({ minutes, pieces }: TimedRun): Decimal {
  readWhole(pieces, 'pieces', 1);
  return readDecimal(minutes, 'minutes', { min: 0 }).times(100).div(pieces);
}

/**
 * Pooled minutes per 100: m = 100 Σ minutes / Σ pieces, the mean of the runs weighted by their
 * pieces. Its spread is the weighted standard deviation
 * √(Σ wᵢ (xᵢ − m)² / ((n − 1)/n · Σ wᵢ)) with the pieces as weights (as in NIST's Dataplot reference
 * manual, from memory); with equal runs it is the usual one. Null where there is no run.
 * @throws InvalidInput
 */
export function poolMinutes(runs: readonly TimedRun[]): PooledMinutes | null {
  if (runs.length === 0) return null;
  const each = runs.map(minutesPer100);
  const pieces = runs.reduce((sum, run) => sum + run.pieces, 0);
  const minutes = runs.reduce((sum, run) => sum.plus(run.minutes), new Exact(0) as Decimal);
  const mean = minutes.times(100).div(pieces);
  const squares = each.reduce(
    (sum, value, at) =>
      sum.plus(
        value
          .minus(mean)
          .pow(2)
          .times(runs[at]?.pieces ?? 0),
      ),
    new Exact(0) as Decimal,
  );
  const n = runs.length;
  const variance = n < 2 ? null : squares.div(new Exact(pieces).times(n - 1).div(n));
  return {
    per100: toAtMost(mean, 2),
    sd: variance === null ? null : toAtMost(variance.sqrt(), 2),
    pieces,
    runs: n,
  };
}
