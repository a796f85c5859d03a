import type { Point } from '../outline/outline.ts';
import { unionPositive } from '../outline/clip.ts';
import { cornerAt, signedArea } from './ring.ts';
import type { Ring } from './problem.ts';

/** A ring and the directions of its edges, as ranks among the directions of both rings. */
interface Course {
  ring: Ring;
  /** rank of the direction of the edge from corner `at` to the next */
  along: number[];
  /** whether the ring turns left at corner `at` */
  left: boolean[];
}

/**
 * The Minkowski sum of polygons: the closed curves of their convolution, whose winding number is
 * how many parts of them meet (Guibas, Ramshaw & Stolfi, "A kinetic framework for computational
 * geometry", FOCS 1983, from memory), united. Convex polygons need no uniting.
 */
export function minkowskiSum(a: Ring, b: Ring): Point[][] {
  const cycles = convolution(a, b);
  if (cycles.length === 1 && isConvex(a) && isConvex(b)) return cycles;
  return unionPositive(cycles);
}

/** Closed curves, to be filled where their winding number is positive. */
export function convolution(a: Ring, b: Ring): Point[][] {
  const [first, second] = [withoutRepeats(a), withoutRepeats(b)];
  const angles = [edgeAngles(first), edgeAngles(second)] as const;
  const { rankOf, count } = ranked(angles.flat());
  const course = (ring: Ring, at: number[]): Course => ({
    ring,
    along: at.map(rankOf),
    left: at.map((angle, corner) => {
      const before = at[(corner + at.length - 1) % at.length] as number;
      return withinHalfTurn(angle - before) > 0;
    }),
  });
  const courses = [course(first, angles[0]), course(second, angles[1])] as const;
  return cyclesOf(stepsOf(courses[0], courses[1], count), first, second);
}

const withoutRepeats = (ring: Ring): Ring =>
  ring.filter((point, at) => {
    const before = cornerAt(ring, at - 1);
    return point.x !== before.x || point.y !== before.y;
  });

/** Directions that differ by less are one: then no rounding can tell them apart in two ways. */
const sameDirection = 1e-11;

function edgeAngles(ring: Ring): number[] {
  return ring.map((from, at) => {
    const to = cornerAt(ring, at + 1);
    const angle = Math.atan2(to.y - from.y, to.x - from.x);
    return angle < -Math.PI + sameDirection ? angle + 2 * Math.PI : angle;
  });
}

function ranked(angles: readonly number[]): { rankOf: (angle: number) => number; count: number } {
  const sorted = Float64Array.from(angles).sort();
  const ranks = new Map<number, number>();
  let [rank, before] = [-1, -Infinity];
  for (const angle of sorted) {
    if (angle - before > sameDirection) rank += 1;
    ranks.set(angle, rank);
    before = angle;
  }
  return { rankOf: (angle) => ranks.get(angle) ?? 0, count: rank + 1 };
}

/** The same angle within (−π, π]. */
function withinHalfTurn(angle: number): number {
  if (angle > Math.PI) return angle - 2 * Math.PI;
  return angle <= -Math.PI ? angle + 2 * Math.PI : angle;
}

/** For every pair of corners (a · bs + b) the pairs that the curves go on to. */
type Steps = Map<number, number[]>;

function stepsOf(a: Course, b: Course, count: number): Steps {
  const steps: Steps = new Map();
  const size = b.ring.length;
  const add = (from: number, to: number) => {
    const others = steps.get(from);
    if (others) others.push(to);
    else steps.set(from, [to]);
  };
  sweep(a, b, count, false, (corner, edge, next, forward) => {
    const [from, to] = [corner * size + edge, corner * size + next];
    add(forward ? from : to, forward ? to : from);
  });
  sweep(b, a, count, true, (corner, edge, next, forward) => {
    const [from, to] = [edge * size + corner, next * size + corner];
    add(forward ? from : to, forward ? to : from);
  });
  return steps;
}

/**
 * Names every edge of `edges` whose direction is passed over in turning at a corner of `corners`.
 * Of edges that point the same way, those of the second ring count as turned a trifle further.
 */
function sweep(
  corners: Course,
  edges: Course,
  count: number,
  second: boolean,
  visit: (corner: number, edge: number, next: number, forward: boolean) => void,
): void {
  const many = edges.ring.length;
  for (let corner = 0; corner < corners.ring.length; corner += 1) {
    const end = corners.along[corner] as number;
    const start = cornerRank(corners, corner - 1);
    if (start === end) continue;
    const left = corners.left[corner] as boolean;
    const [from, to] = left ? [start, end] : [end, start];
    const width = (to - from + count) % count;
    for (let edge = 0; edge < many; edge += 1) {
      const past = ((edges.along[edge] as number) - from + count) % count;
      const passed = second ? past > 0 && past <= width : past < width;
      if (passed) visit(corner, edge, (edge + 1) % many, left);
    }
  }
}

const cornerRank = ({ along }: Course, at: number): number =>
  along[(at + along.length) % along.length] as number;

function cyclesOf(steps: Steps, a: Ring, b: Ring): Point[][] {
  const cycles: Point[][] = [];
  for (const start of steps.keys()) {
    let onward = steps.get(start);
    while (onward && onward.length > 0) {
      const cycle = [];
      let at: number | undefined = start;
      while (at !== undefined) {
        const [p, q] = [cornerAt(a, Math.floor(at / b.length)), cornerAt(b, at % b.length)];
        cycle.push({ x: p.x + q.x, y: p.y + q.y });
        at = steps.get(at)?.pop();
        if (at === start) break;
      }
      cycles.push(cycle);
      onward = steps.get(start);
    }
  }
  return cycles;
}

/** Whether a counter-clockwise ring never turns right. */
function isConvex(points: Ring): boolean {
  const ring = withoutRepeats(points);
  if (signedArea(ring) <= 0) return false;
  return ring.every((corner, at) => {
    const [before, after] = [cornerAt(ring, at - 1), cornerAt(ring, at + 1)];
    const [ax, ay] = [corner.x - before.x, corner.y - before.y];
    return ax * (after.y - corner.y) - ay * (after.x - corner.x) >= 0;
  });
}
