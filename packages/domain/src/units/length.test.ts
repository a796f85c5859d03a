import { describe, expect, it } from 'vitest';
import { readLength } from './length.ts';

describe('readLength', () => {
  it.each([
    ['95', 'mm', '95'],
    ['0.5', 'in', '12.7'],
    ['4 3/8', 'in', '111.125'],
    ['3/8', 'in', '9.525'],
    ['1/64', 'in', '0.396875'],
    ['11', 'in', '279.4'],
    ['11 in', 'mm', '279.4'],
    ['95 mm', 'in', '95'],
    ['2"', 'mm', '50.8'],
    ['4⅜', 'in', '111.125'],
  ] as const)('reads %s (%s) as %s mm', (text, unit, mm) => {
    expect(readLength(text, unit)?.toFixed()).toBe(mm);
  });

  it.each(['', 'in', '4 3', '-4', '4,5', '1e2', 'NaN', '3/', '3/0', '4 3/8/2', '5 cm', '4 ft'])(
    'finds no length in "%s"',
    (text) => {
      expect(readLength(text, 'in')).toBeUndefined();
    },
  );
});
