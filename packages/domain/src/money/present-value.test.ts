import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { paybackYears } from './payback.ts';
import { presentValue } from './present-value.ts';

const cents = (value: number): string => (value / 100).toFixed(2);
const aFlow = fc.integer({ min: -500_000, max: 500_000 }).map(cents);
const flows = fc.array(aFlow, { minLength: 1, maxLength: 12 });

describe('presentValue', () => {
  it('is the sum where nothing is discounted', () => {
    fc.assert(
      fc.property(flows, (each) => {
        const sum = each.reduce((total, flow) => total + Math.round(Number(flow) * 100), 0);
        expect(presentValue(0, each)).toBe(cents(sum).replace('-0.00', '0.00'));
      }),
    );
  });

  it('is less the later the same money comes', () => {
    fc.assert(
      fc.property(fc.integer({ min: 1, max: 100 }), (percent) => {
        const later = presentValue(percent / 100, ['0', '0', '1000']);
        const sooner = presentValue(percent / 100, ['0', '1000', '0']);
        expect(Number(later)).toBeLessThan(Number(sooner));
      }),
    );
  });

  it.each([
    ['rate', -0.1, ['1']],
    ['rate', 8, ['1']],
    ['flows', 0.1, []],
    ['flows.1', 0.1, ['1', 'much']],
  ])('refuses %s where it makes no sense', (field, rate, each) => {
    expect(() => presentValue(rate, each)).toThrow(expect.objectContaining({ field }));
  });
});

describe('paybackYears', () => {
  it('is outlay over income where every year brings the same', () => {
    fc.assert(
      fc.property(
        fc.integer({ min: 1, max: 90_000 }),
        fc.integer({ min: 10_000, max: 90_000 }),
        (outlay, income) => {
          const years = Array.from({ length: 10 }, () => cents(income));
          expect(paybackYears([cents(-outlay), ...years])).toBeCloseTo(outlay / income, 10);
        },
      ),
    );
  });

  it('waits through a year that costs money, and says where it never comes', () => {
    expect(paybackYears(['-100', '50', '-20', '140'])).toBe(2.5);
    expect(paybackYears(['-100', '50'])).toBeNull();
    expect(paybackYears(['-100', '50', '50'])).toBe(2);
  });

  it('begins with money spent', () => {
    expect(() => paybackYears(['100', '50'])).toThrow('Begin with the money spent');
    expect(() => paybackYears([])).toThrow('Begin with the money spent');
  });
});
