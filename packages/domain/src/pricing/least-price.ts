import type { Decimal } from 'decimal.js';
import { NotWorkable } from '../errors/domain-error.ts';
import { type DecimalText, Exact, toText } from '../numbers/decimal-text.ts';

const mostSteps = 10_000_000;

/**
 * The smallest multiple of the price step that is enough. `reaches` must stay true once it is, as the
 * price rises. Rounding, card fees and charges move the exact answer away from the guess: it is
 * bracketed by doubling steps and then halved.
 * @throws NotWorkable where no price is enough
 */
export function leastPrice(
  step: DecimalText,
  guess: Decimal,
  reaches: (price: Decimal) => boolean,
): DecimalText {
  const priceOf = (steps: number) => new Exact(step).times(steps);
  const enough = (steps: number) => reaches(priceOf(steps));
  const start = Math.min(mostSteps, Math.max(1, guess.div(step).ceil().toNumber()));
  let [low, high] = enough(start) ? below(start, enough) : above(start, enough);
  while (high - low > 1) {
    const middle = Math.floor((low + high) / 2);
    if (enough(middle)) high = middle;
    else low = middle;
  }
  return toText(priceOf(high));
}

/** The last that is not enough (or 0) and one that is, walking down from one that is. */
function below(start: number, enough: (steps: number) => boolean): [number, number] {
  let high = start;
  for (let stride = 1; high > 1; stride *= 2) {
    const next = Math.max(1, high - stride);
    if (!enough(next)) return [next, high];
    high = next;
  }
  return [0, high];
}

function above(start: number, enough: (steps: number) => boolean): [number, number] {
  let low = start;
  for (let stride = 1; low < mostSteps; stride *= 2) {
    const next = Math.min(mostSteps, low + stride);
    if (enough(next)) return [low, next];
    low = next;
  }
  throw new NotWorkable('No price reaches that: card fees or the rule asked take all of it.');
}
