import type { DrawnPolygon, Point } from './outline.ts';
import { type Ring, ringBounds, toMicrometre, turnedRing, withoutRepeats } from './ring.ts';

/** The corners of a drawn outline about the origin, counter-clockwise, in whole micrometres. */
export function centredPoints(outline: DrawnPolygon): Point[] {
  return turnedRing(moved(outline.points, middle(outline.points)), 'counter-clockwise');
}

/** The holes that are punched with it, in the same place, clockwise. */
export function centredHoles({ points, punched }: DrawnPolygon): Point[][] {
  const by = middle(points);
  return (punched ?? []).map((hole) => turnedRing(moved(hole, by), 'clockwise'));
}

/** The middle of the bounding box, to the micrometre: moving by it keeps every corner where it is to its neighbours. */
function middle(points: Ring): Point {
  const { minX, minY, maxX, maxY } = ringBounds(points.map(toMicrometre));
  return toMicrometre({ x: (minX + maxX) / 2, y: (minY + maxY) / 2 });
}

const moved = (ring: Ring, by: Point): Point[] =>
  withoutRepeats(
    ring.map(toMicrometre).map(({ x, y }) => toMicrometre({ x: x - by.x, y: y - by.y })),
  );
