import { InvalidInput } from '../errors/domain-error.ts';
import { allocate } from '../money/allocate.ts';
import { type DecimalText, readDecimal } from '../numbers/decimal-text.ts';

export const carriageBases = ['value', 'area', 'count'] as const;
export type CarriageBasis = (typeof carriageBases)[number];

/** One thing that came: leather with its area, or hardware with its count. */
export interface CarriedLine {
  /** what the goods cost, 0 or more */
  goods: DecimalText;
  /** of leather, above 0; null of hardware */
  areaMm2: DecimalText | null;
  /** of hardware, above 0; null of leather, and of what the customer brought, which bears nothing */
  quantity: number | null;
}

const refusals: Record<CarriageBasis, string> = {
  value: 'Nothing that came cost anything: share the carriage by area or by count instead.',
  area: 'No leather came: share the carriage by value or by count instead.',
  count: 'No hardware came: share the carriage by value or by area instead.',
};

const allTheirs =
  'The customer brought all that came, which costs nothing: leave freight and duty at 0.';

/**
 * What each line of a delivery bears of an amount that was paid for all of it, such as freight or
 * duty, to the cent; the parts sum to the amount exactly. By `value` all lines bear it, by what
 * they cost; by `area` the leather alone, by `count` the hardware alone.
 * @throws InvalidInput naming `sharedBy` where the amount is above 0 and nothing can bear it
 */
export function shareCarriage(
  amount: DecimalText,
  lines: readonly CarriedLine[],
  by: CarriageBasis,
): DecimalText[] {
  if (readDecimal(amount, 'amount', { places: 2, min: 0 }).isZero()) return lines.map(() => '0.00');
  if (lines.every(({ areaMm2, quantity }) => areaMm2 === null && quantity === null))
    throw new InvalidInput('sharedBy', allTheirs);
  const weights = lines.map((line) => weightOf(line, by));
  if (weights.every((weight) => readDecimal(weight, 'goods', { min: 0 }).isZero()))
    throw new InvalidInput('sharedBy', refusals[by]);
  return allocate(amount, weights);
}

function weightOf({ goods, areaMm2, quantity }: CarriedLine, by: CarriageBasis): DecimalText {
  if (by === 'value') return goods;
  if (by === 'area') return areaMm2 ?? '0';
  return String(quantity ?? 0);
}
