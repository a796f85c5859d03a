import { describe, expect, it } from 'vitest';
import { Exact, readDecimal, readWhole, toAtMost, toPlaces, toText } from './decimal-text.ts';

describe('readDecimal', () => {
  it.each(['0', '12', '12.50', '-3', '0.0001', '123456789012345678901234.5'])(
    'reads %s',
    (text) => {
      expect(readDecimal(text, 'price').eq(text)).toBe(true);
    },
  );

  it.each([
    '',
    ' 1',
    'NaN',
    'Infinity',
    '-0',
    '-0.00',
    '1e3',
    '1e309',
    '1,5',
    '.5',
    '5.',
    '+1',
    '0x1f',
    '--1',
  ])('refuses "%s" and names the field', (text) => {
    expect(() => readDecimal(text, 'price')).toThrow(expect.objectContaining({ field: 'price' }));
  });

  it.each([12, null, undefined, ['1'], { valueOf: () => '1' }])(
    'refuses %s, which is no text',
    (value) => {
      expect(() => readDecimal(value, 'price')).toThrow('Write price as a plain number');
    },
  );

  it('keeps to the limits, and says them', () => {
    expect(() => readDecimal('-1', 'price', { min: 0 })).toThrow('Write price as 0 or more.');
    expect(() => readDecimal('11', 'price', { max: 10 })).toThrow('Write price as 10 or less.');
    expect(() => readDecimal('1.005', 'price', { places: 2 })).toThrow('at most 2 decimals');
    expect(readDecimal('1.500', 'price', { places: 1 }).toNumber()).toBe(1.5);
  });
});

describe('readWhole', () => {
  it.each([1.5, Number.NaN, Infinity, -0, -1, 2 ** 53, '3'])('refuses %s', (value) => {
    expect(() => readWhole(value, 'quantity')).toThrow(
      expect.objectContaining({ field: 'quantity' }),
    );
  });
});

describe('writing decimals', () => {
  it('never writes an exponent or a signed zero', () => {
    expect(toText(new Exact('1e-9'))).toBe('0.000000001');
    expect(toText(new Exact(-0))).toBe('0');
    expect(toPlaces(new Exact('-0.001'), 2)).toBe('0.00');
    expect(toPlaces(new Exact('-0.005'), 2)).toBe('-0.01');
    expect(toAtMost(new Exact('12.500'), 2)).toBe('12.5');
  });
});
