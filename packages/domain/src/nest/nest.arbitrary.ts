import fc from 'fast-check';
import type { Point } from '../outline/outline.ts';
import type { NestProblem, Rotations } from './problem.ts';

/** For the tests: a corner for every angle, nearer and farther: star-shaped, mostly with reflex corners. */
const aStar: fc.Arbitrary<Point[]> = fc
  .array(fc.integer({ min: 12, max: 45 }), { minLength: 5, maxLength: 12 })
  .map((radii) => radii.map((radius, at) => onCircle(radius, at / radii.length)));

/** A thin bar, bent in the middle. */
const aThinBar: fc.Arbitrary<Point[]> = fc
  .tuple(
    fc.integer({ min: 40, max: 120 }),
    fc.integer({ min: 3, max: 9 }),
    fc.integer({ min: -20, max: 20 }),
  )
  .map(([long, wide, bend]) => [
    { x: 0, y: 0 },
    { x: long / 2, y: bend },
    { x: long, y: 0 },
    { x: long, y: wide },
    { x: long / 2, y: bend + wide },
    { x: 0, y: wide },
  ]);

/** Two round ends of different size with a flank on either side. */
const aDrop: fc.Arbitrary<Point[]> = fc
  .tuple(
    fc.integer({ min: 12, max: 30 }),
    fc.integer({ min: 2, max: 10 }),
    fc.integer({ min: 30, max: 70 }),
  )
  .map(([large, small, far]) => [...arc(0, large, 0.25, 0.75), ...arc(far, small, 0.75, 1.25)]);

/** A half-moon: an arc outside and a flatter one inside. */
const aMoon: fc.Arbitrary<Point[]> = fc
  .tuple(fc.integer({ min: 20, max: 40 }), fc.integer({ min: 4, max: 12 }))
  .map(([radius, thick]) => [
    ...arc(0, radius, 0, 0.5),
    ...arc(0, radius - thick, 0, 0.5).reverse(),
  ]);

const onCircle = (radius: number, share: number): Point => ({
  x: radius * Math.cos(2 * Math.PI * share),
  y: radius * Math.sin(2 * Math.PI * share),
});

function arc(x: number, radius: number, from: number, to: number): Point[] {
  return Array.from({ length: 17 }, (_, at) => {
    const point = onCircle(radius, from + ((to - from) * at) / 16);
    return { x: point.x + x, y: point.y };
  });
}

export const anOutlineRing: fc.Arbitrary<Point[]> = fc.oneof(aStar, aThinBar, aDrop, aMoon);

const someRotations: fc.Arbitrary<Rotations> = fc.constantFrom<Rotations>(
  [0],
  [0, 180],
  [0, 90, 180, 270],
  'free',
);

/** A small panel, with and without spacing, trim and a flaw. */
export const aPanelProblem: fc.Arbitrary<NestProblem> = fc.record({
  outline: anOutlineRing,
  container: fc.record({
    type: fc.constant('rect' as const),
    w: fc.integer({ min: 90, max: 320 }),
    h: fc.integer({ min: 90, max: 320 }),
  }),
  gap: fc.constantFrom(0, 0.5, 2),
  rotations: someRotations,
  trim: fc.constantFrom(0, 5),
  holes: fc.constantFrom<Point[][]>([], [arc(60, 8, 0, 0.9)]),
});
