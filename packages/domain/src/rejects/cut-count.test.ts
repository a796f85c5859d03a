import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { plainAllowance, rolledYield, upToFull, upToFullRows } from './allowance.ts';
import { cutCount } from './cut-count.ts';

const aRate = fc.integer({ min: 1, max: 100 }).map((percent) => percent / 100);
const aConfidence = fc.integer({ min: 500, max: 999 }).map((value) => value / 1000);

/** P(X ≥ good) by adding up binomial terms directly, for small counts. */
function chance(pieces: number, good: number, rate: number): number {
  let sum = 0;
  for (let x = good; x <= pieces; x += 1) {
    let term = rate ** x * (1 - rate) ** (pieces - x);
    for (let k = 1; k <= pieces - x; k += 1) term *= (x + k) / k;
    sum += term;
  }
  return sum;
}

describe('cutCount', { timeout: 60_000 }, () => {
  it('is the smallest count that is sure enough', () => {
    fc.assert(
      fc.property(
        fc.integer({ min: 1, max: 40 }),
        aRate.filter((rate) => rate > 0.3),
        aConfidence,
        (good, rate, confidence) => {
          const { pieces, probability } = cutCount({ good, rate, confidence });
          expect(probability).toBeCloseTo(chance(pieces, good, rate), 10);
          expect(probability).toBeGreaterThanOrEqual(confidence - 1e-12);
          if (pieces > good) expect(chance(pieces - 1, good, rate)).toBeLessThan(confidence);
        },
      ),
    );
  });

  it('never asks for fewer with more rejects, more sureness or a larger order', () => {
    fc.assert(
      fc.property(
        fc.integer({ min: 1, max: 3000 }),
        aRate,
        aConfidence,
        (good, rate, confidence) => {
          const { pieces } = cutCount({ good, rate, confidence });
          const worse = Math.max(0.005, rate - 0.02);
          expect(cutCount({ good, rate: worse, confidence }).pieces).toBeGreaterThanOrEqual(pieces);
          expect(cutCount({ good: good + 1, rate, confidence }).pieces).toBeGreaterThan(pieces - 1);
          const surer = Math.min(0.9999, confidence + 0.0005);
          expect(cutCount({ good, rate, confidence: surer }).pieces).toBeGreaterThanOrEqual(pieces);
        },
      ),
    );
  });

  it('cuts no more than ordered where nothing fails', () => {
    expect(cutCount({ good: 250, rate: 1, confidence: 0.999 })).toEqual({
      pieces: 250,
      probability: 1,
    });
  });

  it('is quick and near the normal approximation for a large order', () => {
    const { pieces } = cutCount({ good: 100_000, rate: 0.95, confidence: 0.95 });
    const mean = 100_000 / 0.95;
    const spread = Math.sqrt((100_000 * 0.05) / 0.95 ** 2);
    expect(Math.abs(pieces - (mean + 1.645 * spread))).toBeLessThan(3);
  });

  it('learns from history, and trusts a long one more than a short one', () => {
    const short = cutCount({ good: 100, history: { good: 19, total: 20 }, confidence: 0.95 });
    const long = cutCount({ good: 100, history: { good: 1900, total: 2000 }, confidence: 0.95 });
    const known = cutCount({ good: 100, rate: 0.95, confidence: 0.95 });
    expect(short.pieces).toBeGreaterThan(long.pieces);
    expect(long.pieces).toBeGreaterThanOrEqual(known.pieces);
  });

  it('asks for a rate where there is no history', () => {
    const nothing = { good: 10, history: { good: 0, total: 0 }, confidence: 0.95 };
    expect(() => cutCount(nothing)).toThrow('enter a rate instead');
  });

  it.each([
    ['good', { good: 0 }],
    ['good', { good: 1.5 }],
    ['rate', { rate: 0 }],
    ['rate', { rate: 1.01 }],
    ['rate', { rate: Number.NaN }],
    ['confidence', { confidence: 1 }],
    ['confidence', { confidence: 0 }],
  ])('refuses a %s that makes no sense', (field, change) => {
    expect(() => cutCount({ good: 10, rate: 0.9, confidence: 0.95, ...change })).toThrow(
      expect.objectContaining({ field }),
    );
  });

  it('gives up with a sentence where nearly everything fails', () => {
    expect(() => cutCount({ good: 1000, rate: 0.00001, confidence: 0.95 })).toThrow(
      'check the rejects',
    );
  });
});

describe('allowances', () => {
  it('rounds up to whole containers', () => {
    expect(upToFull(109, 20)).toEqual({ containers: 6, pieces: 120, overs: 11 });
    expect(upToFull(120, 20)).toEqual({ containers: 6, pieces: 120, overs: 0 });
    expect(() => upToFull(5, 0)).toThrow('whole number from 1');
  });

  it('rounds up to rows that differ in length, whole panels first', () => {
    expect(upToFullRows(9, [5, 4, 5])).toEqual({ rows: 2, pieces: 9, overs: 0 });
    expect(upToFullRows(10, [5, 4, 5])).toEqual({ rows: 3, pieces: 14, overs: 4 });
    expect(upToFullRows(30, [5, 4, 5])).toEqual({ rows: 7, pieces: 33, overs: 3 });
    expect(upToFullRows(0, [5, 4])).toEqual({ rows: 0, pieces: 0, overs: 0 });
    expect(() => upToFullRows(3, [])).toThrow('perRow');
    expect(() => upToFullRows(3, [2, 0])).toThrow('perRow.1');
  });

  it('is the same for equal rows, told one by one or once', () => {
    const rows = fc.integer({ min: 1, max: 9 });
    fc.assert(
      fc.property(fc.nat(500), rows, rows, (pieces, count, each) => {
        const listed = Array.from({ length: count }, () => each);
        expect(upToFullRows(pieces, listed)).toEqual(upToFullRows(pieces, each));
      }),
    );
  });

  it('divides without paying for a last digit', () => {
    expect(plainAllowance(9, 0.3)).toBe(30);
    expect(plainAllowance(100, 0.95)).toBe(106);
    expect(rolledYield({ rates: [0.9, 0.5], good: 45 })).toEqual({ yield: 0.45, start: 100 });
    expect(() => rolledYield({ rates: [0.9, 0], good: 45 })).toThrow('comes out good');
  });
});
