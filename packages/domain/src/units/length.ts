import { convert } from './convert.ts';
import { asMm, type Mm } from './measures.ts';
import { readMixedNumber } from './mixed-number.ts';

/**
 * Reads a length as people write it: '95', '0.5', '4 3/8', '3/8'. A unit written after it ('4 in',
 * '95 mm') wins over the unit asked for. Rounded to a nanometre, so that 1/64 in is exact. Undefined where it is none.
 */
export function readLength(text: string, unit: 'mm' | 'in'): Mm | undefined {
  const [, figure = text, written] = /^(.*?)\s*(mm|in|")$/.exec(text.trim()) ?? [];
  const from = written === undefined ? unit : written === 'mm' ? 'mm' : 'in';
  const value = readMixedNumber(figure);
  return value && asMm(convert(value, from, 'mm').toDecimalPlaces(6));
}
