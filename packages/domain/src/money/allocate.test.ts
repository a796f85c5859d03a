import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { Exact } from '../numbers/decimal-text.ts';
import { allocate } from './allocate.ts';

const cents = fc.integer({ min: -(2 ** 53 - 1), max: 2 ** 53 - 1 });
const aWeight = fc.oneof(
  fc.integer({ min: 0, max: 1_000_000 }),
  fc.integer({ min: 0, max: 1_000_000 }).map((value) => new Exact(value).div(1000).toFixed()),
);
const someWeights = fc
  .array(aWeight, { minLength: 1, maxLength: 30 })
  .filter((weights) => weights.some((weight) => Number(weight) > 0));

describe('allocate', () => {
  it('loses nothing and makes nothing up', () => {
    fc.assert(
      fc.property(cents, someWeights, (amount, weights) => {
        const text = new Exact(amount)
          .div(100)
          .toFixed(2)
          .replace(/^-0\.00$/, '0.00');
        const sum = allocate(text, weights).reduce((total, part) => total.plus(part), new Exact(0));
        expect(sum.eq(text)).toBe(true);
      }),
    );
  });

  it('gives each less than a cent away from its exact share, and nothing to a weight of 0', () => {
    fc.assert(
      fc.property(fc.integer({ min: 0, max: 1e9 }), someWeights, (amount, weights) => {
        const all = weights.reduce<InstanceType<typeof Exact>>(
          (sum, weight) => sum.plus(weight),
          new Exact(0),
        );
        allocate(new Exact(amount).div(100).toFixed(2), weights).forEach((part, at) => {
          const exact = new Exact(amount).times(weights[at] ?? 0).div(all);
          expect(exact.minus(new Exact(part).times(100)).abs().lt(1)).toBe(true);
        });
      }),
    );
  });

  it('gives ties to the earlier', () => {
    expect(allocate('0.02', [1, 1, 1])).toEqual(['0.01', '0.01', '0.00']);
  });

  it('mirrors an amount below zero', () => {
    expect(allocate('-100.00', [1, 1, 1])).toEqual(['-33.34', '-33.33', '-33.33']);
  });

  it('refuses weights that share nothing, and amounts finer than the places', () => {
    expect(() => allocate('1.00', [0, 0])).toThrow('at least one weight above 0');
    expect(() => allocate('1.00', [])).toThrow('at least one weight above 0');
    expect(() => allocate('1.00', [1, -1])).toThrow(
      expect.objectContaining({ field: 'weights.1' }),
    );
    expect(() => allocate('1.005', [1])).toThrow('at most 2 decimals');
  });
});
