import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { convert } from './convert.ts';
import { formatFootage, mm2ToFootage, readFootage } from './footage.ts';

describe('readFootage', () => {
  it.each([
    ['24.75', '24.75'],
    ['24³', '24.75'],
    ['24/3', '24.75'],
    ['4/1', '4.25'],
    ['24/2', '24.5'],
    ['3/3', '3.75'],
    ['24 3/4', '24.75'],
    ['24¾', '24.75'],
    ['24 ½', '24.5'],
    ['24¹', '24.25'],
    ['3/4', '0.75'],
    ['1/2', '0.5'],
    [' 7 ', '7'],
  ])('reads %s as %s ft²', (text, ft2) => {
    expect(readFootage(text)?.toFixed()).toBe(ft2);
  });

  it.each(['', '24/4', '24/0', '24/5', '24⁴', '24.', '-3', '24 3/2', '24,75', '24.5³', '24.5/1'])(
    'finds no area in "%s"',
    (text) => {
      expect(readFootage(text)).toBeUndefined();
    },
  );
});

describe('formatFootage', () => {
  it('writes tenths and quarters, half up', () => {
    const mm2 = convert('24.75', 'ft2', 'mm2');
    expect(formatFootage(mm2)).toBe('24.8');
    expect(formatFootage(mm2, 'quarter')).toBe('24³');
    expect(formatFootage(convert('24.9', 'ft2', 'mm2'), 'quarter')).toBe('25');
  });

  it('writes quarters that read back to the same area', () => {
    fc.assert(
      fc.property(fc.integer({ min: 0, max: 4000 }), (quarters) => {
        const mm2 = mm2ToFootage(0).plus(quarters).div(4).times('92903.04');
        expect(readFootage(formatFootage(mm2, 'quarter'))?.eq(mm2ToFootage(mm2))).toBe(true);
      }),
    );
  });
});
