import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { footageToMm2, formatFootage, mm2ToFootage, parseFootage } from './footage.ts';

describe('parseFootage', () => {
  it.each([
    ['24.75', '24.75'],
    ['24³', '24.75'],
    ['24 3/4', '24.75'],
    ['24¾', '24.75'],
    ['24 ½', '24.5'],
    ['24¹', '24.25'],
    [' 7 ', '7'],
  ])('reads %s as %s ft²', (text, ft2) => {
    expect(parseFootage(text).toFixed()).toBe(ft2);
  });

  it.each(['', '24/3', '24⁴', '24.', '-3', '24 3/5', '24 3/2', '24,75', '24.5³', 'NaN', '1e3'])(
    'refuses "%s"',
    (text) => {
      expect(() => parseFootage(text)).toThrow('Write the footage as 24.75, 24³ or 24 3/4.');
    },
  );
});

describe('formatFootage', () => {
  it('writes tenths and quarters, half up', () => {
    const mm2 = footageToMm2(parseFootage('24.75'));
    expect(formatFootage(mm2)).toBe('24.8');
    expect(formatFootage(mm2, 'quarter')).toBe('24³');
    expect(formatFootage(footageToMm2(parseFootage('24.9')), 'quarter')).toBe('25');
  });

  it('writes quarters that read back to the same area', () => {
    fc.assert(
      fc.property(fc.integer({ min: 0, max: 4000 }), (quarters) => {
        const mm2 = mm2ToFootage(0).plus(quarters).div(4).times('92903.04');
        expect(footageToMm2(parseFootage(formatFootage(mm2, 'quarter'))).eq(mm2)).toBe(true);
      }),
    );
  });
});
