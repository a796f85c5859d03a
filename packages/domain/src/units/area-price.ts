import type { Decimal } from 'decimal.js';
import { type DecimalText, Exact, readDecimal, toAtMost } from '../numbers/decimal-text.ts';
import { convert } from './convert.ts';

export type PricedArea = 'ft2' | 'dm2' | 'm2';

/** How finely a price is said: as finely as one in ft² is kept, or to the cent for a large unit. */
const places: Record<PricedArea, number> = { ft2: 4, dm2: 4, m2: 2 };

/**
 * A price for another area as the price of one ft², rounded half up to the 4 places in which it is
 * kept: 1 ft² = 9.290304 dm².
 * @throws InvalidInput
 */
export function pricePerFt2(price: DecimalText, per: PricedArea): DecimalText {
  const read = readDecimal(price, 'price', { min: 0, max: '1000000000000' });
  return toAtMost(read.times(feetIn(per)), 4);
}

/** The price of one ft² as that of another area: to 4 places, of a m² to 2. @throws InvalidInput */
export function priceFromFt2(price: DecimalText, per: PricedArea): DecimalText {
  const read = readDecimal(price, 'price', { min: 0, max: '1000000000000' });
  return toAtMost(read.div(feetIn(per)), places[per]);
}

/** How many of the area one ft² is. */
const feetIn = (per: PricedArea): Decimal => new Exact(convert('1', 'ft2', per));
