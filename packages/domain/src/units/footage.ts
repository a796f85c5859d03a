import type { Decimal } from 'decimal.js';
import { Exact, toPlaces } from '../numbers/decimal-text.ts';
import { asFt2, type Ft2, MM2_PER_FT2 } from './measures.ts';
import { readMixedNumber } from './mixed-number.ts';

const raised = ['', '¹', '²', '³'];

/**
 * Reads an area in ft² as it is typed or copied from the flesh side: '24.75', '24 3/4', '24¾', or with the quarters
 * after the feet, '24³' and '24/3'; 0 or more and below ten million. What is below 1 is a fraction: '3/4' is three
 * quarters of a foot. Undefined where it is no area. The marks: Etherington & Roberts, Bookbinding and the
 * Conservation of Books, 1982, s.v. footage, "4/1" for 4 1/4.
 */
export function readFootage(text: string): Ft2 | undefined {
  const ft2 = readMixedNumber(text) ?? readMark(text);
  return ft2 && asFt2(ft2);
}

function readMark(text: string): Decimal | undefined {
  const [, feet, small = '', beside] =
    /^(\d{1,7})(?:\s*([¹²³])|\/([1-3]))$/.exec(text.trim()) ?? [];
  if (feet === undefined) return undefined;
  return new Exact(beside ?? raised.indexOf(small)).div(4).plus(feet);
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
