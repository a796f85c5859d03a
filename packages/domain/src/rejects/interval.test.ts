import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { chanceOfEnough } from './chance.ts';
import { cutCount } from './cut-count.ts';
import { goodShareInterval, type IntervalMethod } from './interval.ts';

const aMethod = fc.constantFrom<IntervalMethod>('wilson', 'jeffreys');
const aConfidence = fc.integer({ min: 50, max: 999 }).map((value) => value / 1000);
const counts = fc
  .integer({ min: 1, max: 5000 })
  .chain((total) => fc.tuple(fc.integer({ min: 0, max: total }), fc.constant(total)));

describe('goodShareInterval', () => {
  it('holds the share seen and stays between 0 and 1', () => {
    fc.assert(
      fc.property(counts, aConfidence, aMethod, ([good, total], confidence, method) => {
        const { low, high } = goodShareInterval({ good, total, confidence, method });
        const middle = method === 'wilson' ? good / total : (good + 0.5) / (total + 1);
        expect(low).toBeGreaterThanOrEqual(0);
        expect(high).toBeLessThanOrEqual(1);
        if (confidence > 0.9) expect([low <= middle, middle <= high]).toEqual([true, true]);
      }),
    );
  });

  it('mirrors itself when good and failed change places', () => {
    fc.assert(
      fc.property(counts, aConfidence, aMethod, ([good, total], confidence, method) => {
        const one = goodShareInterval({ good, total, confidence, method });
        const other = goodShareInterval({ good: total - good, total, confidence, method });
        expect(one.low).toBeCloseTo(1 - other.high, 10);
        expect(one.high).toBeCloseTo(1 - other.low, 10);
      }),
    );
  });

  it('narrows with more pieces and widens with more sureness', () => {
    fc.assert(
      fc.property(counts, aMethod, ([good, total], method) => {
        const width = (times: number, confidence: number) => {
          const asked = { good: good * times, total: total * times, confidence, method };
          const { low, high } = goodShareInterval(asked);
          return high - low;
        };
        expect(width(10, 0.95)).toBeLessThan(width(1, 0.95));
        expect(width(1, 0.99)).toBeGreaterThan(width(1, 0.95));
      }),
    );
  });

  it.each([
    ['good', { good: 11 }],
    ['good', { good: -1 }],
    ['good', { good: 1.5 }],
    ['total', { total: 0 }],
    ['confidence', { confidence: 1 }],
    ['confidence', { confidence: 95 }],
  ])('refuses %s where it makes no sense', (field, change) => {
    const asked = { good: 9, total: 10, confidence: 0.95, method: 'wilson' as const };
    expect(() => goodShareInterval({ ...asked, ...change })).toThrow(
      expect.objectContaining({ field }),
    );
  });
});

describe('chanceOfEnough', () => {
  it('is the probability that a cut count names', () => {
    fc.assert(
      fc.property(
        fc.integer({ min: 1, max: 2000 }),
        fc.integer({ min: 50, max: 100 }).map((percent) => percent / 100),
        (good, rate) => {
          const { pieces, probability } = cutCount({ good, rate, confidence: 0.9 });
          expect(chanceOfEnough(pieces, good, rate)).toBeCloseTo(probability, 9);
        },
      ),
    );
  });

  it('is none where fewer are made than needed', () => {
    expect(chanceOfEnough(9, 10, 1)).toBe(0);
    expect(chanceOfEnough(10, 10, 1)).toBe(1);
  });
});
