import { priceRun, type BreakNumbers, type RunInput, type RunNumbers } from '@hidewright/domain';
import type { Quote } from './quote.entity.ts';

/**
 * A quote's numbers as they were worked out. Those kept before a run had options know less, at the same prices:
 * what they lack is worked out again from the same input.
 */
export function numbersOfQuote(quote: Pick<Quote, 'input' | 'numbers'>): RunNumbers {
  const kept = quote.numbers as RunNumbers | Pick<RunNumbers, 'breaks'>;
  return 'options' in kept ? kept : priceRun(quote.input as RunInput);
}

/** The rungs of an option, or of the piece as it is. Numbers of an earlier release have no options. */
export function rungsOf(
  numbers: Pick<RunNumbers, 'breaks'> & Partial<RunNumbers>,
  option: string | null,
): BreakNumbers[] {
  return numbers.options?.find(({ name }) => name === option)?.breaks ?? numbers.breaks;
}
