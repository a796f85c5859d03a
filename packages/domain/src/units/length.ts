import { InvalidInput } from '../errors/domain-error.ts';
import { Exact } from '../numbers/decimal-text.ts';
import { convert } from './convert.ts';
import { asMm, type Mm } from './measures.ts';

const shape = /^(?:(\d{1,7})(\.\d{1,9})?|(?:(\d{1,7})\s+)?(\d{1,4})\/(\d{1,4}))\s*(mm|in|")?$/;

/**
 * Reads a length as people write it: '95', '0.5', '4 3/8', '3/8'. A unit written after it ('4 in',
 * '95 mm') wins over the unit asked for. Rounded to a nanometre, so that 1/64 in is exact.
 * @throws InvalidInput
 */
export function parseLength(text: string, unit: 'mm' | 'in'): Mm {
  const match = shape.exec(text.trim());
  if (!match) throw new InvalidInput('length', lengthHelp(unit));
  const [, whole = '', decimals = '', wholeOfFraction = '0', top, bottom, written] = match;
  if (bottom !== undefined && Number(bottom) === 0) {
    throw new InvalidInput('length', 'A fraction cannot be over 0: write it as 4 3/8.');
  }
  const value =
    top === undefined || bottom === undefined
      ? new Exact(whole + decimals)
      : new Exact(wholeOfFraction).plus(new Exact(top).div(bottom));
  const from = written === undefined ? unit : written === 'mm' ? 'mm' : 'in';
  return asMm(convert(value, from, 'mm').toDecimalPlaces(6));
}

const lengthHelp = (unit: 'mm' | 'in'): string =>
  unit === 'in'
    ? 'Write the length in inches, such as 11, 4.375 or 4 3/8.'
    : 'Write the length in millimetres, such as 95 or 9.5.';
