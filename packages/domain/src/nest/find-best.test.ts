import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { findBest } from './find-best.ts';
import { nestFaults } from './nest-faults.ts';
import { aPanelProblem } from './nest.arbitrary.ts';
import { planRegular } from './plan-regular.ts';
import type { NestProblem } from './problem.ts';

describe('the best found anyhow', () => {
  it('can be cut, gives no fewer than the regular plan, and is the same every time', () => {
    fc.assert(
      fc.property(aPanelProblem, (problem) => {
        const seedPlan = planRegular(problem);
        const best = findBest(problem, { seedPlan, budget: 10 });
        expect(nestFaults(problem, best)).toEqual([]);
        expect(best.length).toBeGreaterThanOrEqual(seedPlan.placements.length);
        expect(findBest(problem, { seedPlan, budget: 10 })).toEqual(best);
      }),
      { numRuns: 6, seed: 5 },
    );
  });

  const rounds: NestProblem = {
    outline: Array.from({ length: 36 }, (_, at) => ({
      x: 20 * Math.cos((at * Math.PI) / 18),
      y: 20 * Math.sin((at * Math.PI) / 18),
    })),
    container: {
      type: 'polygon',
      points: [
        { x: 0, y: 30 },
        { x: 260, y: 0 },
        { x: 330, y: 180 },
        { x: 210, y: 300 },
        { x: 20, y: 240 },
      ],
    },
    gap: 1,
    rotations: [0],
  };

  it('brings more pieces into a side than rows do', () => {
    const seedPlan = planRegular(rounds);
    expect(findBest(rounds, { seedPlan }).length).toBeGreaterThan(seedPlan.placements.length);
  });

  it('says how far it is, and stops when asked', () => {
    const seedPlan = planRegular(rounds);
    const shares: number[] = [];
    const best = findBest(rounds, {
      seedPlan,
      onProgress: (share) => shares.push(share),
      shouldStop: () => shares.length >= 3,
    });
    expect(shares).toHaveLength(3);
    expect(best.length).toBeGreaterThanOrEqual(seedPlan.placements.length);
  });
});
