import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { crostonForecast, smoothedUse } from './forecast.ts';

const aUse = fc.integer({ min: 0, max: 500 });
const anAlpha = fc.integer({ min: 1, max: 100 }).map((percent) => percent / 100);
const series = fc.array(aUse, { minLength: 1, maxLength: 60 });

describe('smoothedUse', () => {
  it('lies between the least and the most it has seen', () => {
    fc.assert(
      fc.property(series, anAlpha, aUse, (uses, alpha, first) => {
        const forecast = smoothedUse(uses, alpha, first);
        expect(forecast).toBeGreaterThanOrEqual(Math.min(first, ...uses) - 1e-9);
        expect(forecast).toBeLessThanOrEqual(Math.max(first, ...uses) + 1e-9);
      }),
    );
  });

  it('is the last use where nothing is remembered', () => {
    expect(smoothedUse([3, 8, 5], 1, 100)).toBe(5);
  });
});

describe('crostonForecast', () => {
  it('is exact for the same use every so many periods', () => {
    fc.assert(
      fc.property(
        fc.integer({ min: 1, max: 99 }),
        fc.integer({ min: 1, max: 12 }),
        anAlpha,
        (use, gap, alpha) => {
          const uses = Array.from({ length: gap * 5 }, (_, at) => ((at + 1) % gap ? 0 : use));
          expect(crostonForecast(uses, alpha).forecast).toBeCloseTo(use / gap, 9);
        },
      ),
    );
  });

  it('changes only when something is used', () => {
    fc.assert(
      fc.property(
        series.filter((uses) => uses.some((use) => use > 0)),
        anAlpha,
        (uses, alpha) => {
          expect(crostonForecast([...uses, 0, 0], alpha)).toEqual(crostonForecast(uses, alpha));
        },
      ),
    );
  });

  it.each([
    ['series', [], 0.1],
    ['series.1', [1, -1], 0.1],
    ['alpha', [1], 0],
    ['alpha', [1], 1.5],
  ])('refuses %s where it makes no sense', (field, uses, alpha) => {
    expect(() => crostonForecast(uses, alpha)).toThrow(expect.objectContaining({ field }));
  });
});

it('expects nothing of what was never used', () => {
  expect(crostonForecast([0, 0, 0], 0.1)).toEqual({ size: 0, interval: 3, forecast: 0 });
});
