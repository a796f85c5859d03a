import { describe, expect, it } from 'vitest';
import { areaFigure, lengthFigure, readArea, readLength, readWeight } from './units.ts';

describe('what a person types for a measure', () => {
  it.each(['24.75', '24,75', '24¾', '24³', '24/3', '24 3/4', '24-3/4'])(
    'reads the area %s as 24.75 ft²',
    (text) => {
      expect(readArea(text, 'ft2')).toBe('2299350.24');
    },
  );

  it.each(['', '-1', '24/4', 'NaN', 'eleven', '1,250'])('finds no area in "%s"', (text) => {
    expect(readArea(text, 'ft2')).toBeUndefined();
  });

  it('reads the marks of a hide in square feet alone', () => {
    expect(readArea('230,5', 'dm2')).toBe('2305000');
    for (const mark of ['230³', '230/3']) expect(readArea(mark, 'dm2')).toBeUndefined();
  });

  it('turns square feet into mm² exactly', () => {
    expect(readArea('24.7', 'ft2')).toBe('2294705.088');
    expect(readArea('1', 'ft2')).toBe('92903.04');
  });

  it('keeps a 64th of an inch exact', () => {
    expect(readLength('1/64', 'in')).toBe('0.396875');
    expect(lengthFigure('0.396875', 'in', 6)).toBe('0.015625');
  });

  it.each([
    ['11 in', 'mm', '279.4'],
    ['4 3/8"', 'mm', '111.125'],
    ['95 mm', 'in', '95'],
    ['4⅜', 'in', '111.125'],
    ['9,5', 'mm', '9.5'],
  ] as const)('takes %s in a shop that measures in %s', (text, unit, mm) => {
    expect(readLength(text, unit)).toBe(mm);
  });

  it.each(['in', '4 ft', '-4 in', '4 3/0 in', '1,250', '1,250 mm', '1,250 in'])(
    'finds no length in %s',
    (text) => {
      expect(readLength(text, 'mm')).toBeUndefined();
    },
  );

  it('shows again what was typed, tenth of a foot by tenth of a foot', () => {
    for (let tenths = 0; tenths < 300; tenths += 1) {
      const typed = String(tenths / 10);
      expect(areaFigure(readArea(typed, 'ft2') ?? '', 'ft2', 4)).toBe(typed);
    }
  });
});

describe('a weight of leather', () => {
  it.each([
    ['5.5', '5.5'],
    ['5½ oz', '5.5'],
    ['2.4 mm', '6.047'],
    ['2.4mm', '6.047'],
    ['0', '0'],
    ['thick', undefined],
    ['-2', undefined],
    ['mm', undefined],
  ])('reads %s as %s oz', (text, oz) => {
    expect(readWeight(text)).toBe(oz);
  });
});
