import { InvalidInput } from '../errors/domain-error.ts';
import { type DecimalText, Exact, readWhole, toAtMost } from '../numbers/decimal-text.ts';
import { goodShareInterval } from '../rejects/interval.ts';

/** Rejects of one run at one step, or in all of it. */
export interface CountedRejects {
  rejected: number;
  /** pieces that were handled there, rejects among them */
  reached: number;
}

/** The rejects of several runs taken together. */
export interface PooledRejects extends CountedRejects {
  /** per cent of the pieces that reached it, 2 decimals at most */
  percent: DecimalText;
  /** between these two the true per cent lies, with the confidence asked for */
  lowPercent: DecimalText;
  highPercent: DecimalText;
}

/**
 * The pooled reject rate Σ rejected / Σ reached of several runs, so that a large run weighs more
 * than a small one, with its Wilson score interval. Null where no piece was counted: without a count
 * there is no rate, and nothing is assumed in its place.
 * @param confidence above 0, below 1
 * @throws InvalidInput where a count is not whole, or more failed than were there
 */
export function poolRejects(
  runs: readonly CountedRejects[],
  confidence = 0.95,
): PooledRejects | null {
  let [rejected, reached] = [0, 0];
  runs.forEach((run, at) => {
    reached += readWhole(run.reached, `runs.${at}.reached`);
    rejected += readWhole(run.rejected, `runs.${at}.rejected`);
    if (run.rejected <= run.reached) return;
    throw new InvalidInput(
      `runs.${at}.rejected`,
      'No more pieces can fail than were there: correct the counts.',
    );
  });
  if (reached === 0) return null;
  const good = { good: reached - rejected, total: reached };
  const { low, high } = goodShareInterval({ ...good, confidence, method: 'wilson' });
  return {
    rejected,
    reached,
    percent: toAtMost(new Exact(rejected).times(100).div(reached), 2),
    lowPercent: percentOf(1 - high),
    highPercent: percentOf(1 - low),
  };
}

const percentOf = (share: number): DecimalText => toAtMost(new Exact(share).times(100), 2);
