import type { ClosedCurve, OpenCurve } from './drawing.ts';
import type { Bounds, Point } from './outline.ts';
import { type Ring, ringArea, ringBounds, ringContains, ringLength } from './ring.ts';
import type { NumberedLine } from './svg/join-ends.ts';
import { mostCurves } from './svg/refusal.ts';

interface Closed {
  closed: ClosedCurve[];
  /** how many lay exactly on another one */
  repeated: number;
  /** how many had no area */
  flat: number;
}

/** Closed lines with their measures, the largest first; where two are the same, the first is kept. */
export function closedCurves(lines: readonly NumberedLine[], tolerance: number): Closed {
  const measured = lines.filter((line) => line.closed).map(measure);
  const wide = measured.filter(({ points }) => !isFlat(points, tolerance));
  const sorted = wide.sort((a, b) => b.area - a.area || a.id - b.id);
  const closed: ClosedCurve[] = [];
  for (const curve of sorted.slice(0, 2 * mostCurves)) {
    if (closed.some((other) => isSame(other, curve, tolerance))) continue;
    closed.push({ ...curve, within: smallestAround(closed, curve) });
  }
  return {
    closed,
    repeated: Math.min(sorted.length, 2 * mostCurves) - closed.length,
    flat: measured.length - wide.length,
  };
}

/** Lines whose ends do not meet, the longest first. */
export function openCurves(lines: readonly NumberedLine[]): OpenCurve[] {
  const open = lines.filter((line) => !line.closed && line.points.length > 1);
  return open
    .map(({ id, points }) => ({
      id,
      points,
      length: lengthOf(points),
      from: points[0] as Point,
      to: points.at(-1) as Point,
    }))
    .sort((a, b) => b.length - a.length || a.id - b.id);
}

function measure({ id, points }: NumberedLine): ClosedCurve {
  const bounds = points.length === 0 ? { minX: 0, minY: 0, maxX: 0, maxY: 0 } : ringBounds(points);
  return {
    id,
    points,
    bounds,
    width: bounds.maxX - bounds.minX,
    height: bounds.maxY - bounds.minY,
    area: Math.abs(ringArea(points)),
    edge: ringLength(points),
    within: null,
  };
}

/** Whether all corners lie in one straight line. (A figure of eight has no area either, but is not flat.) */
function isFlat(points: readonly Point[], tolerance: number): boolean {
  const [first] = points;
  if (!first || points.length < 3) return true;
  const away = ({ x, y }: Point) => Math.hypot(x - first.x, y - first.y);
  const far = points.reduce((best, point) => (away(point) > away(best) ? point : best));
  const length = away(far);
  const [dx, dy] = [(far.x - first.x) / length, (far.y - first.y) / length];
  return points.every(
    ({ x, y }) => !(Math.abs((x - first.x) * dy - (y - first.y) * dx) > tolerance),
  );
}

/** A filled shape and its drawn edge are often saved as two curves that lie on each other. */
function isSame(a: ClosedCurve, b: ClosedCurve, tolerance: number): boolean {
  const within = 2 * tolerance;
  return (
    Math.abs(a.area - b.area) <= within * a.edge &&
    Math.abs(a.edge - b.edge) <= within * Math.PI &&
    sides.every((side) => Math.abs(a.bounds[side] - b.bounds[side]) <= within)
  );
}

const sides = ['minX', 'minY', 'maxX', 'maxY'] as const;

/** Larger ones come first, so the last that holds it is the smallest. */
function smallestAround(larger: readonly ClosedCurve[], curve: ClosedCurve): number | null {
  const around = larger.findLast(
    (other) => holds(other.bounds, curve.bounds) && contains(other.points, curve.points),
  );
  return around?.id ?? null;
}

const contains = (outer: Ring, [corner]: Ring): boolean =>
  corner !== undefined && ringContains(outer, corner);

const holds = (outer: Bounds, inner: Bounds): boolean =>
  outer.minX <= inner.minX &&
  outer.minY <= inner.minY &&
  outer.maxX >= inner.maxX &&
  outer.maxY >= inner.maxY;

function lengthOf(points: readonly Point[]): number {
  return points.slice(1).reduce((sum, to, at) => {
    const from = points[at] as Point;
    return sum + Math.hypot(to.x - from.x, to.y - from.y);
  }, 0);
}
