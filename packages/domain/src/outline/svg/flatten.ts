import type { Point } from '../outline.ts';
import { largestScale, type Matrix, moved } from './matrix.ts';
import { mostVertices, refusal } from './refusal.ts';
import { arcPlace, type Segment, type Stroke } from './stroke.ts';

/** A line of the drawing by its corners, which lie on it; where it is closed the first is not repeated. */
export interface Polyline {
  points: Point[];
  closed: boolean;
}

/** How many corners may still come. */
export interface Budget {
  vertices: number;
}

/**
 * Follows a stroke, placed by a matrix, by straight lines that leave it by the tolerance at most.
 * @throws InvalidInput where it leads nowhere, or beyond what a drawing may hold
 */
export function flatten(
  stroke: Stroke,
  matrix: Matrix,
  tolerance: number,
  budget: Budget,
): Polyline {
  const points = [finite(moved(matrix, stroke.from))];
  for (const segment of stroke.segments) {
    const from = points.at(-1) as Point;
    const placed = placedSegment(segment, matrix, from, tolerance);
    budget.vertices -= placed.count;
    if (!(budget.vertices >= 0)) throw tooMany();
    for (let at = 1; at < placed.count; at += 1) points.push(finite(placed.at(at / placed.count)));
    points.push(finite(moved(matrix, segment.to)));
  }
  return tidied(points, stroke.closed);
}

/** How many lines a segment needs, and the point at a share (0 to 1) of it. */
interface Placed {
  count: number;
  at: (share: number) => Point;
}

function placedSegment(segment: Segment, matrix: Matrix, from: Point, tolerance: number): Placed {
  switch (segment.kind) {
    case 'line':
      return { count: 1, at: () => from };
    case 'quadratic': {
      const [handle, to] = [moved(matrix, segment.handle), moved(matrix, segment.to)];
      const count = linesFor((2 / 8) * bend(from, handle, to), tolerance);
      return {
        count,
        at: (share) => blend(blend(from, handle, share), blend(handle, to, share), share),
      };
    }
    case 'cubic': {
      const [first, second] = segment.handles.map((handle) => moved(matrix, handle)) as [
        Point,
        Point,
      ];
      const to = moved(matrix, segment.to);
      const most = Math.max(bend(from, first, second), bend(first, second, to));
      const count = linesFor((6 / 8) * most, tolerance);
      return { count, at: (share) => cubicPlace([from, first, second, to], share) };
    }
    case 'arc': {
      const count = linesForArc(segment, matrix, tolerance);
      return { count, at: (share) => moved(matrix, arcPlace(segment, share)) };
    }
  }
}

/**
 * A curve cut into n equal parts of its parameter leaves its chords by no more than 1/n² of the
 * largest second difference times d(d − 1)/8. Source: Wang's formula; the remainder of linear
 * interpolation.
 */
const linesFor = (most: number, tolerance: number): number =>
  Math.max(1, Math.ceil(Math.sqrt(most / tolerance)));

/** A whole turn gets a multiple of 12, so that its widest and highest points are corners. */
function linesForArc(
  arc: Extract<Segment, { kind: 'arc' }>,
  matrix: Matrix,
  tolerance: number,
): number {
  const radius = Math.max(arc.radiusX, arc.radiusY) * largestScale(matrix);
  const step = 2 * Math.acos(Math.max(0, 1 - tolerance / radius));
  const count = Math.max(1, Math.ceil(Math.abs(arc.sweep) / step));
  return Math.abs(arc.sweep) > 6.28 ? 12 * Math.ceil(count / 12) : count;
}

const bend = (a: Point, b: Point, c: Point): number =>
  Math.hypot(a.x - 2 * b.x + c.x, a.y - 2 * b.y + c.y);

const blend = (a: Point, b: Point, share: number): Point => ({
  x: a.x + (b.x - a.x) * share,
  y: a.y + (b.y - a.y) * share,
});

function cubicPlace([a, b, c, d]: readonly [Point, Point, Point, Point], share: number): Point {
  const [ab, bc, cd] = [blend(a, b, share), blend(b, c, share), blend(c, d, share)];
  return blend(blend(ab, bc, share), blend(bc, cd, share), share);
}

function tidied(points: Point[], closed: boolean): Polyline {
  const kept = points.filter((point, at) => at === 0 || !same(point, points[at - 1] as Point));
  if (closed && kept.length > 1 && same(kept[0] as Point, kept.at(-1) as Point)) kept.pop();
  return { points: kept, closed };
}

const same = (a: Point, b: Point): boolean => a.x === b.x && a.y === b.y;

function finite(point: Point): Point {
  if (Math.abs(point.x) < 1e9 && Math.abs(point.y) < 1e9) return point;
  throw refusal('A line of the drawing leads to a place beyond all measure. Save it again.');
}

const tooMany = () =>
  refusal(
    `The drawing needs more than ${mostVertices.toLocaleString('en')} corners. ` +
      'Leave only what is cut in it, and simplify its curves.',
  );
