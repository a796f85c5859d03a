import type { PriceBreak } from '../pricing/price-breaks.ts';
import { InputReader } from './read-input.ts';

export function asPriceBreak(value: unknown, field: string): PriceBreak {
  const read = new InputReader(value, ['from', 'price'], field);
  return { from: read.number('from'), price: read.decimal('price') };
}
