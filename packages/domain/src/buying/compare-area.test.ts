import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { Exact } from '../numbers/decimal-text.ts';
import { compareArea } from './compare-area.ts';

const ft2 = (feet: number) => new Exact(feet).times('92903.04').toFixed();

// A tolerance of 3 %: common practice, no source.
describe('a side measured against its mark', () => {
  it('is short when it misses more than the tolerance', () => {
    expect(compareArea(ft2(25), ft2(24), '3')).toEqual({
      differenceMm2: '-92903.04',
      percent: '-4',
      short: true,
    });
  });

  it('passes at exactly the tolerance, and is short a thousandth of a mm² below it', () => {
    expect(compareArea('1000000', '970000', '3').short).toBe(false);
    expect(compareArea('1000000', '969999.999', '3').short).toBe(true);
  });

  it('is never short where more came than was marked', () => {
    expect(compareArea(ft2(24), ft2(25), '0')).toMatchObject({ percent: '4.17', short: false });
    expect(compareArea(ft2(24), ft2(24), '0')).toMatchObject({ differenceMm2: '0', short: false });
  });

  it('is judged alike at any scale, and a wider tolerance never finds more', () => {
    const area = fc.integer({ min: 1, max: 1e9 });
    fc.assert(
      fc.property(area, area, fc.integer({ min: 0, max: 100 }), (marked, measured, tolerance) => {
        const judge = (times: number, percent: number) =>
          compareArea(String(marked * times), String(measured * times), String(percent)).short;
        expect(judge(1, tolerance)).toBe(judge(3, tolerance));
        if (tolerance < 100 && judge(1, tolerance + 1)) expect(judge(1, tolerance)).toBe(true);
      }),
    );
  });

  it('refuses an area of nothing', () => {
    expect(() => compareArea('0', '5', '3')).toThrow(
      expect.objectContaining({ field: 'markedMm2' }),
    );
    expect(() => compareArea('5', '0', '3')).toThrow(
      expect.objectContaining({ field: 'measuredMm2' }),
    );
  });
});
