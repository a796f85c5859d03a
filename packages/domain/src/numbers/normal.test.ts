import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { normalAbove, normalLoss, normalQuantile } from './normal.ts';

const aZ = fc.double({ min: -8, max: 8, noNaN: true });

describe('the normal distribution', () => {
  it('has a quantile that undoes it, far into both tails', () => {
    fc.assert(
      fc.property(fc.double({ min: 1e-12, max: 0.5, noNaN: true }), (tail) => {
        expect(normalAbove(-normalQuantile(tail)) / tail).toBeCloseTo(1, 12);
      }),
    );
  });

  it('mirrors itself, and never rises above a smaller value', () => {
    fc.assert(
      fc.property(aZ, aZ, (a, b) => {
        expect(normalAbove(a) + normalAbove(-a)).toBeCloseTo(1, 14);
        expect(normalAbove(Math.min(a, b))).toBeGreaterThanOrEqual(normalAbove(Math.max(a, b)));
      }),
    );
  });

  it('is smooth where the series hands over to the fraction', () => {
    expect(normalAbove(3 - 1e-13) / normalAbove(3)).toBeCloseTo(1, 11);
  });

  it('loses z more at −z than at z', () => {
    fc.assert(
      fc.property(aZ, (z) => {
        expect(normalLoss(-z) - normalLoss(z)).toBeCloseTo(z, 12);
      }),
    );
  });

  it.each([0, 1, -0.1, 2, Number.NaN])('refuses a share of %f', (share) => {
    expect(() => normalQuantile(share, 'service')).toThrow('above 0 and below 1');
  });
});
