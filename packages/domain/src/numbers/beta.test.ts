import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { betaBelow, betaQuantile } from './beta.ts';

const aShape = fc.integer({ min: 1, max: 4000 }).map((halves) => halves / 2);
const aShare = fc.double({ min: 0.001, max: 0.999, noNaN: true });

describe('the beta distribution', () => {
  it('is x^a where b is 1, and x where both are', () => {
    fc.assert(
      fc.property(aShape, aShare, (a, x) => {
        expect(betaBelow(x, a, 1)).toBeCloseTo(x ** a, 10);
      }),
    );
  });

  it('is the arcsine law for a = b = 1/2', () => {
    fc.assert(
      fc.property(aShare, (x) => {
        const arcsine = (2 / Math.PI) * Math.asin(Math.sqrt(x));
        expect(betaBelow(x, 0.5, 0.5)).toBeCloseTo(arcsine, 12);
      }),
    );
  });

  it('has a quantile that undoes it', () => {
    fc.assert(
      fc.property(aShape, aShape, aShare, (a, b, share) => {
        expect(betaBelow(betaQuantile(share, a, b), a, b)).toBeCloseTo(share, 9);
      }),
    );
  });
});
