import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { chanceOfEnough } from './chance.ts';
import { cutCount } from './cut-count.ts';
import { planCut } from './plan-cut.ts';

const asked = { good: 100, rate: 0.9, confidence: 0.95, perContainer: 21, perRow: 7 };

describe('how many to cut', () => {
  it('goes up to full rows and whole panels, and says what is over', () => {
    const plan = planCut(asked);
    expect(plan.cutCount).toBe(cutCount({ good: 100, rate: 0.9, confidence: 0.95 }).pieces);
    expect(plan).toMatchObject({
      basis: 'rate',
      fullRows: { rows: 17, pieces: 119, overs: 119 - plan.cutCount },
      containers: 6,
      cutPieces: 126,
      overs: 126 - plan.cutCount,
    });
  });

  it('shows what the plain allowance risks', () => {
    const { plain } = planCut(asked);
    expect(plain.pieces).toBe(112);
    expect(plain.probability).toBeCloseTo(chanceOfEnough(112, 100, 0.9), 6);
    expect(plain.probability).toBeLessThan(0.75);
  });

  it('rests on the shop’s own runs once there are any, which are less sure than a rate', () => {
    const history = { good: 180, total: 200 };
    const learned = planCut({ ...asked, history });
    expect(learned.basis).toBe('history');
    expect(learned.cutCount).toBe(cutCount({ good: 100, history, confidence: 0.95 }).pieces);
    expect(learned.cutCount).toBeGreaterThan(planCut(asked).cutCount);
    expect(planCut({ ...asked, history: null })).toEqual(planCut(asked));
  });

  it('refuses a history in which nothing came out good', () => {
    expect(() => planCut({ ...asked, history: { good: 0, total: 40 } })).toThrow('enter a rate');
  });

  it('never gives fewer than asked, and its rows and panels are full', () => {
    const rate = fc.integer({ min: 40, max: 100 }).map((percent) => percent / 100);
    const count = fc.integer({ min: 1, max: 60 });
    fc.assert(
      fc.property(fc.integer({ min: 1, max: 400 }), rate, count, count, (good, share, per, row) => {
        const input = { good, rate: share, confidence: 0.9, perContainer: per, perRow: row };
        const plan = planCut(input);
        expect(plan.cutCount).toBeGreaterThanOrEqual(good);
        expect(plan.cutPieces % per).toBe(0);
        expect(plan.cutPieces - plan.overs).toBe(plan.cutCount);
        expect((plan.fullRows?.pieces ?? 0) % row).toBe(0);
        expect(plan.overs).toBeLessThan(per);
      }),
    );
  });
});
