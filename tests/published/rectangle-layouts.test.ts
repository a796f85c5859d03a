import { findBest, nestFaults, planRegular, type NestProblem } from '@hidewright/domain';
import { expect, it } from 'vitest';

const rectangle = (w: number, h: number) => [
  { x: 0, y: 0 },
  { x: w, y: 0 },
  { x: w, y: h },
  { x: 0, y: h },
];

// Optimal counts of equal rectangles in a rectangle: Martins & Dell, “Solving the pallet loading
// problem”, EJOR 184 (2008) 429–440, for the definitions; the values proved by exhaustive search.
it.each([
  [40, 25, 7, 3, 47],
  [52, 33, 9, 4, 47],
  [86, 82, 15, 11, 42],
  [43, 26, 7, 3, 53],
  [1200, 800, 300, 200, 16],
])('on %s × %s, the best layout of %s × %s gives %s', (w, h, length, width, count) => {
  const problem: NestProblem = {
    outline: rectangle(length, width),
    container: { type: 'rect', w, h },
    gap: 0,
    rotations: [0, 90, 180, 270],
  };
  const best = findBest(problem, { seedPlan: planRegular(problem) });
  expect(nestFaults(problem, best)).toEqual([]);
  expect(best).toHaveLength(count);
});
