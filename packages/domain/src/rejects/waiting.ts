import { NotWorkable } from '../errors/domain-error.ts';

/** How failures pile up while one waits for the last good piece. */
export interface Waiting {
  /** natural logarithm of the chance that no piece fails */
  logNoneFail: number;
  /** chance of j + 1 failures over the chance of j */
  ratio: (failures: number) => number;
}

export interface Wait {
  failures: number;
  probability: number;
}

const mostFailures = 5_000_000;
const rescaleAbove = 1e100;
/** A chance this little below the confidence is rounding, as where 0.8 + 0.16 should be 0.96. */
const slack = 1e-12;

/**
 * The fewest failures to allow for, so that the last good piece has come with the given confidence.
 * The first chance can be too small for a floating point number, so the sum runs in a scale of its
 * own that follows it.
 */
export function waitFor({ logNoneFail, ratio }: Waiting, confidence: number): Wait {
  let logScale = logNoneFail;
  let term = 1;
  let sum = 1;
  for (let failures = 0; failures <= mostFailures; failures += 1) {
    if (Math.log(sum) + logScale >= Math.log(confidence - slack)) {
      return { failures, probability: Math.min(1, sum * Math.exp(logScale)) };
    }
    term *= ratio(failures);
    sum += term;
    if (sum > rescaleAbove) {
      term /= rescaleAbove;
      sum /= rescaleAbove;
      logScale += Math.log(rescaleAbove);
    }
  }
  throw new NotWorkable(
    'So many pieces would fail that no cut count is worth naming: check the rejects, or enter a rate.',
  );
}
