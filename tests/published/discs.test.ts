import { findBest, nestFaults, planRegular, type NestProblem } from '@hidewright/domain';
import { expect, it } from 'vitest';

/** A round piece as the engine gets it: a polygon of 96 corners on the circle. */
const disc = (radius: number) =>
  Array.from({ length: 96 }, (_, at) => ({
    x: radius * Math.cos((at * Math.PI) / 48),
    y: radius * Math.sin((at * Math.PI) / 48),
  }));

/** Half a per cent smaller than what is just possible, so that a search has something to find. */
const slack = 0.995;

// Largest radius of n equal circles in a unit square: recomputed by SLSQP from many starts, agreeing
// with the values of the usual tables, which are recalled from memory. In a square of 300 mm.
it.each([
  [5, 0.207106781187],
  [7, 0.17445763019],
  [8, 0.170540688701],
  [10, 0.148204322565],
  [11, 0.142399237696],
  [13, 0.1339935135],
  [14, 0.12933179371],
])('%s discs of the radius that is just possible for them lie in a square', (count, radius) => {
  const problem: NestProblem = {
    outline: disc(300 * radius * slack),
    container: { type: 'rect', w: 300, h: 300 },
    gap: 0,
    rotations: [0],
  };
  const best = findBest(problem, { seedPlan: planRegular(problem) });
  expect(nestFaults(problem, best)).toEqual([]);
  expect(best.length).toBeGreaterThanOrEqual(count);
});

it('finds more than rows give for small discs on a panel, the same each time', () => {
  const problem: NestProblem = {
    outline: disc(15),
    container: { type: 'rect', w: 304.8, h: 304.8 },
    gap: 1,
    rotations: [0, 180],
  };
  const seedPlan = planRegular(problem);
  const told: number[] = [];
  const best = findBest(problem, { seedPlan, onProgress: (share) => told.push(share) });
  expect(best.length).toBeGreaterThanOrEqual(101);
  expect(nestFaults(problem, best)).toEqual([]);
  expect(findBest(problem, { seedPlan })).toEqual(best);
  expect(told.length).toBeGreaterThan(10);
  expect(Math.max(...told)).toBeLessThanOrEqual(1);
  // A person may stop it at once: then the rows stand.
  expect(findBest(problem, { seedPlan, shouldStop: () => true })).toEqual(seedPlan.placements);
});
