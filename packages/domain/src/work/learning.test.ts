import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { learnedTime } from './learning.ts';

const aCurve = fc.integer({ min: 51, max: 100 }).map((percent) => percent / 100);
const aCount = fc.integer({ min: 1, max: 3000 });

describe('learnedTime', () => {
  it('takes the share of the curve at every doubling, the unit or the average', () => {
    fc.assert(
      fc.property(aCurve, aCount, (curve, n) => {
        const units = [n, 2 * n].map((count) => learnedTime('unit', curve, count).unit);
        const averages = [n, 2 * n].map((count) => learnedTime('cumulative', curve, count).average);
        expect((units[1] ?? 0) / (units[0] ?? 0)).toBeCloseTo(curve, 10);
        expect((averages[1] ?? 0) / (averages[0] ?? 0)).toBeCloseTo(curve, 10);
      }),
    );
  });

  it('adds up its units, in both models', () => {
    fc.assert(
      fc.property(fc.constantFrom('unit', 'cumulative'), aCurve, aCount, (model, curve, n) => {
        const [here, next] = [learnedTime(model, curve, n), learnedTime(model, curve, n + 1)];
        expect((here.total + next.unit) / next.total).toBeCloseTo(1, 12);
        expect(here.average * n).toBeCloseTo(here.total, 8);
        expect(next.unit).toBeLessThanOrEqual(here.unit + 1e-12);
      }),
    );
  });

  it.each([
    ['curve', 'unit', 0, 5],
    ['curve', 'unit', 1.01, 5],
    ['curve', 'unit', 80, 5],
    ['curve', 'cumulative', 0.5, 5],
    ['n', 'unit', 0.8, 0],
    ['n', 'unit', 0.8, 2.5],
  ] as const)('refuses a %s that makes no sense', (field, model, curve, n) => {
    expect(() => learnedTime(model, curve, n)).toThrow(expect.objectContaining({ field }));
  });
});
