import type { Decimal } from 'decimal.js';
import { type DecimalText, Exact, readDecimal, toAtMost } from '../numbers/decimal-text.ts';

/** Leather of one run. */
export interface CutRun {
  /** area that its layout says for the panels or strips that were cut, mm², 1 or more */
  layoutAreaMm2: DecimalText;
  /** area that was taken and did not go back, mm² */
  usedAreaMm2: DecimalText;
}

/** What several runs took beyond their layouts. */
export interface PooledLeather {
  /** per cent on top of the layout, 0 or more, 2 decimals at most */
  extraPercent: DecimalText;
  /** the run that took least and the one that took most, below 0 where a run took less */
  leastPercent: DecimalText;
  mostPercent: DecimalText;
  runs: number;
}

/**
 * How much more leather runs took than their layouts say: 100 (Σ used ÷ Σ layout − 1), so that a large
 * run weighs more than a small one. Runs that together took less than their layouts say nothing on
 * top: a layout cannot be cut from less than it covers. Null where there is no run.
 * @throws InvalidInput
 */
export function poolLeather(runs: readonly CutRun[]): PooledLeather | null {
  if (runs.length === 0) return null;
  let [layout, used] = [new Exact(0) as Decimal, new Exact(0) as Decimal];
  const each = runs.map((run, at) => {
    const said = readDecimal(run.layoutAreaMm2, `runs.${at}.layoutAreaMm2`, { min: 1 });
    const was = readDecimal(run.usedAreaMm2, `runs.${at}.usedAreaMm2`, { min: 0 });
    layout = layout.plus(said);
    used = used.plus(was);
    return beyond(was, said);
  });
  return {
    extraPercent: toAtMost(Exact.max(0, beyond(used, layout)), 2),
    leastPercent: toAtMost(Exact.min(...each), 2),
    mostPercent: toAtMost(Exact.max(...each), 2),
    runs: runs.length,
  };
}

const beyond = (was: Decimal, said: Decimal): Decimal => was.div(said).minus(1).times(100);
