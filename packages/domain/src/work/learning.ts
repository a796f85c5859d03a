import { InvalidInput } from '../errors/domain-error.ts';
import { readWhole } from '../numbers/decimal-text.ts';
import { readNumber } from '../numbers/read-number.ts';

export type LearningModel = 'unit' | 'cumulative';

/** Times as multiples of the first unit's time. */
export interface LearnedTime {
  /** the n-th unit alone */
  unit: number;
  /** per unit, over the first n */
  average: number;
  /** the first n together */
  total: number;
}

const mostUnits = 10_000_000;

/**
 * How long the n-th unit takes where every doubling brings the time down to the share `curve`, with
 * b = log₂ curve. Model `unit` (Crawford): the n-th unit takes n^b. Model `cumulative` (Wright): the
 * first n take n^b on average, n^(1 + b) in total. Both in Delionback, NASA TM X-64968 (1975).
 * @param curve above 0, up to 1 (0.8 is an 80 % curve); for `cumulative` above 0.5, since at a half
 *   the later units would take no time at all
 * @param n 1 to 10^7
 * @throws InvalidInput
 */
export function learnedTime(model: LearningModel, curve: number, n: number): LearnedTime {
  readWhole(n, 'n', 1, mostUnits);
  readNumber(curve, 'curve', { above: 0, max: 1 });
  if (model === 'unit') return crawford(Math.log2(curve), n);
  if (curve <= 0.5) {
    throw new InvalidInput(
      'curve',
      'A cumulative curve lies above 0.5: at a half, two units would take no longer than one.',
    );
  }
  return wright(Math.log2(curve), n);
}

function crawford(slope: number, n: number): LearnedTime {
  let total = 0;
  // The smallest terms first, so that a long sum keeps its last digits.
  for (let at = n; at >= 1; at -= 1) total += at ** slope;
  return { unit: n ** slope, average: total / n, total };
}

function wright(slope: number, n: number): LearnedTime {
  const total = n ** (1 + slope);
  // n^(1+b) − (n−1)^(1+b), without the difference of two nearly equal numbers.
  const unit = -Math.expm1((1 + slope) * Math.log1p(-1 / n)) * total;
  return { unit, average: n ** slope, total };
}
