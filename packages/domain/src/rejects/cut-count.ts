import { InvalidInput } from '../errors/domain-error.ts';
import { readWhole } from '../numbers/decimal-text.ts';
import { type Wait, type Waiting, waitFor } from './waiting.ts';

export interface CutByRate {
  good: number;
  /** share of pieces that come out good, above 0, up to 1 */
  rate: number;
  /** chance that enough are good, between 0 and 1 */
  confidence: number;
}

export interface CutByHistory {
  good: number;
  /** what came out of earlier runs */
  history: { good: number; total: number };
  confidence: number;
}

export interface CutCount {
  pieces: number;
  probability: number;
}

const mostGood = 1_000_000;

/**
 * The fewest pieces to cut so that at least `good` are good with the given confidence: the smallest
 * n with P(X ≥ good) ≥ confidence, where X is binomial (n, rate), or, from the shop's own runs,
 * beta-binomial with Jeffreys' prior: Beta(good + 1/2, failed + 1/2).
 * @throws InvalidInput · NotWorkable where nearly everything fails
 */
export function cutCount(input: CutByRate | CutByHistory): CutCount {
  const good = readWhole(input.good, 'good', 1, mostGood);
  const confidence = readShare(input.confidence, 'confidence');
  if (confidence >= 1) {
    throw new InvalidInput(
      'confidence',
      'Nothing is certain: choose a confidence below 1, such as 0.95.',
    );
  }
  const waiting =
    'rate' in input
      ? waitingAtRate(good, readShare(input.rate, 'rate'))
      : waitingFromHistory(good, input.history);
  return asCutCount(good, waitFor(waiting, confidence));
}

const asCutCount = (good: number, wait: Wait): CutCount => ({
  pieces: good + wait.failures,
  probability: wait.probability,
});

function readShare(value: unknown, field: string): number {
  if (typeof value !== 'number' || !(value > 0) || !(value <= 1)) {
    throw new InvalidInput(field, `Write ${field} as a share above 0 and up to 1, such as 0.95.`);
  }
  return value;
}

/** Failures before the last good piece are negative binomial. */
function waitingAtRate(good: number, rate: number): Waiting {
  const bad = 1 - rate;
  return {
    logNoneFail: good * Math.log(rate),
    ratio: (failures) => ((good + failures) / (failures + 1)) * bad,
  };
}

/** With an uncertain rate they are beta negative binomial. */
function waitingFromHistory(good: number, history: { good: number; total: number }): Waiting {
  const total = readWhole(history.total, 'history.total', 0);
  const goodBefore = readWhole(history.good, 'history.good', 0);
  if (goodBefore > total) {
    throw new InvalidInput(
      'history.good',
      'No more pieces can be good than were made: check the two counts.',
    );
  }
  if (goodBefore === 0) {
    throw new InvalidInput(
      'history',
      'There are no good pieces to learn from yet: enter a rate instead.',
    );
  }
  const alpha = goodBefore + 0.5;
  const beta = total - goodBefore + 0.5;
  let logNoneFail = 0;
  for (let at = 0; at < good; at += 1) logNoneFail -= Math.log1p(beta / (alpha + at));
  return {
    logNoneFail,
    ratio: (failures) =>
      ((good + failures) / (failures + 1)) * ((beta + failures) / (alpha + beta + good + failures)),
  };
}
