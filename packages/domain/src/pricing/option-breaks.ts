import type { Break, RunOption } from '../costing/run-input.ts';
import { InvalidInput } from '../errors/domain-error.ts';
import { type DecimalText, Exact, toText } from '../numbers/decimal-text.ts';
import type { BreakNumbers } from './run-numbers.ts';

/**
 * What an option is asked for at each quantity: the price of the run as it is and what the option
 * costs beyond it: typed, or else the difference of the two worked-out prices.
 * @param suggested the option's own worked-out prices, in the order of `breaks`; null where typed
 * @throws InvalidInput where an option would cost nothing
 */
export function optionBreaks(
  { name, typedExtra }: RunOption,
  option: number,
  breaks: readonly BreakNumbers[],
  suggested: readonly DecimalText[] | null,
): Break[] {
  return breaks.map((base, at) => {
    const extra = typedExtra ?? new Exact(suggested?.[at] ?? '0').minus(base.suggestedPrice);
    const price = new Exact(base.priceEach).plus(extra);
    if (price.lte(0)) {
      throw new InvalidInput(
        `options.${option}.typedExtra`,
        `${name} would cost nothing at ${base.quantity}: write a smaller difference.`,
      );
    }
    return { quantity: base.quantity, typedPrice: toText(price) };
  });
}
