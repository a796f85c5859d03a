import { type DecimalText, Exact, readWhole, toAtMost } from '../numbers/decimal-text.ts';

/** One kind of hardware in one run. */
export interface FittedRun {
  /** units that the pieces it was fitted to needed */
  needed: number;
  /** units that were taken and did not go back */
  taken: number;
}

/** What of a kind of hardware several runs spoiled. */
export interface PooledLosses {
  /** per cent of what was taken, 0 or more, 2 decimals at most */
  percent: DecimalText;
  needed: number;
  taken: number;
  runs: number;
}

/**
 * The share of hardware that runs spoiled: 100 (1 − Σ needed ÷ Σ taken), of what was taken, as the
 * losses of a pattern are reckoned. Where less was taken than the pieces needed, some of it came from
 * elsewhere, and nothing is said to be lost. Null where nothing was taken.
 * @throws InvalidInput where a count is not whole
 */
export function poolLosses(runs: readonly FittedRun[]): PooledLosses | null {
  let [needed, taken] = [0, 0];
  runs.forEach((run, at) => {
    needed += readWhole(run.needed, `runs.${at}.needed`);
    taken += readWhole(run.taken, `runs.${at}.taken`);
  });
  if (taken === 0) return null;
  const lost = new Exact(1).minus(new Exact(needed).div(taken)).times(100);
  return { percent: toAtMost(Exact.max(0, lost), 2), needed, taken, runs: runs.length };
}
