import { cutCount, rolledYield } from '@hidewright/domain';
import jstat from 'jstat';
import { describe, expect, it } from 'vitest';
import plan from './binomial-plan.json' with { type: 'json' };

// Source of both tables: named in binomial-plan.json beside them.
describe('cut counts', { timeout: 60_000 }, () => {
  it(`are those of all ${plan.rows.length} rows of the binomial table`, () => {
    const wrong = plan.rows.filter(([good = 0, rate = 0, confidence = 0, pieces]) => {
      return cutCount({ good, rate, confidence }).pieces !== pieces;
    });
    expect(wrong).toEqual([]);
    expect(plan.rows.length).toBe(456);
  });

  it(`are those of all ${plan.historyRows.length} rows of the beta-binomial table`, () => {
    const wrong = plan.historyRows.filter(([goodBefore = 0, total = 0, good = 0, pieces]) => {
      const history = { good: goodBefore, total };
      return cutCount({ good, history, confidence: 0.95 }).pieces !== pieces;
    });
    expect(wrong).toEqual([]);
    expect(plan.historyRows.length).toBeGreaterThan(15);
  });

  // Chances of the same source, beside some rows of the beta-binomial table.
  it.each([
    [9, 10, 10, 0.9580609632162924],
    [9, 10, 100, 0.9521863588632524],
    [19, 20, 24, 0.9532596216375676],
    [19, 20, 100, 0.9525503225266182],
  ])('from %i good of %i, %i are enough with %f', (goodBefore, total, good, probability) => {
    const history = { good: goodBefore, total };
    const cut = cutCount({ good, history, confidence: 0.95 });
    expect(cut.probability).toBeCloseTo(probability, 10);
  });

  // Second opinion: jstat 1.9.6, binomial distribution by the incomplete beta function.
  it('agree with a statistics library, on other values than the tables', () => {
    for (const good of [3, 17, 61, 133, 333, 777]) {
      for (const rate of [0.61, 0.77, 0.873, 0.935, 0.991]) {
        const { pieces, probability } = cutCount({ good, rate, confidence: 0.925 });
        const chance = (count: number) => 1 - jstat.binomial.cdf(good - 1, count, rate);
        expect(chance(pieces)).toBeCloseTo(probability, 7);
        expect(chance(pieces)).toBeGreaterThanOrEqual(0.925 - 1e-9);
        if (pieces > good) expect(chance(pieces - 1)).toBeLessThan(0.925);
      }
    }
  });
});

describe('rolled yield', () => {
  // Pyzdek, The Six Sigma Project Planner (2003), p. 241: four steps, 0.979, start 1,022 for 1,000.
  // (Author and year from memory.)
  it('is 0.979 for the four steps of a published example, and needs 1,022 for 1,000', () => {
    const { yield: share, start } = rolledYield({
      rates: [0.995, 0.985, 0.999, 0.99995],
      good: 1000,
    });
    expect(share).toBeCloseTo(0.979, 3);
    expect(start).toBe(1022);
  });

  // Tompkins et al., Facilities Planning: 97,000 good after scrap of 4 %, 1 % and 3 % needs 105,219.
  it('is that of a series of scrap rates', () => {
    expect(rolledYield({ rates: [0.96, 0.99, 0.97], good: 97_000 }).start).toBe(105_219);
  });
});
