import type { Decimal } from 'decimal.js';
import { InvalidInput } from '../errors/domain-error.ts';
import { Exact, toPlaces } from '../numbers/decimal-text.ts';
import { asFt2, asMm2, type Ft2, MM2_PER_FT2, type Mm2 } from './measures.ts';

const quarterMarks: Record<string, string> = {
  '¹': '0.25',
  '²': '0.5',
  '³': '0.75',
  '¼': '0.25',
  '½': '0.5',
  '¾': '0.75',
  '1/4': '0.25',
  '1/2': '0.5',
  '2/4': '0.5',
  '3/4': '0.75',
};
const raised = ['', '¹', '²', '³'];

/**
 * Reads an area as it is marked on the flesh side: '24.75', '24³' (24 and three quarters),
 * '24 3/4', '24¾'. Between 0 and 100,000 ft².
 * @throws InvalidInput
 */
export function parseFootage(text: string): Ft2 {
  const match = /^(\d{1,6})(?:(\.\d{1,6})|\s*([¹²³¼½¾])|\s+([123]\/[24]))?$/.exec(text.trim());
  const [, whole, decimals = '', mark, fraction] = match ?? [];
  const quarters = quarterMarks[mark ?? fraction ?? ''];
  if (whole === undefined || (fraction !== undefined && quarters === undefined)) {
    throw new InvalidInput('footage', 'Write the footage as 24.75, 24³ or 24 3/4.');
  }
  return asFt2(new Exact(whole + decimals).plus(quarters ?? 0));
}

/** Square feet in mm². */
export function footageToMm2(ft2: Ft2): Mm2 {
  return asMm2(ft2.times(MM2_PER_FT2));
}

/** mm² in square feet, unrounded. */
export function mm2ToFootage(mm2: Decimal | string | number): Ft2 {
  return asFt2(new Exact(mm2).div(MM2_PER_FT2));
}

/**
 * Writes an area in ft², rounded half up to a tenth ('24.8') or to a quarter ('24³'), the two
 * habits of the trade (Etherington & Roberts, Bookbinding and the Conservation of Books, 1982,
 * s.v. footage).
 */
export function formatFootage(
  mm2: Decimal | string | number,
  step: 'tenth' | 'quarter' = 'tenth',
): string {
  const ft2 = mm2ToFootage(mm2);
  if (step === 'tenth') return toPlaces(ft2, 1);
  const quarters = ft2.times(4).toDecimalPlaces(0);
  const whole = quarters.divToInt(4);
  return `${whole.toFixed()}${raised[quarters.minus(whole.times(4)).toNumber()] ?? ''}`;
}
