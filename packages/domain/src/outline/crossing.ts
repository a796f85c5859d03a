import type { Point } from './outline.ts';
import { nextCorner, type Ring } from './ring.ts';

/** Where closed curves meet that should not: their places in mm. */
export interface Crossing extends Point {
  how: 'crosses' | 'touches';
  /** the numbers of the two rings; the same twice where one meets itself */
  rings: readonly [number, number];
}

interface Edge {
  ring: number;
  at: number;
  last: number;
  from: Point;
  to: Point;
  minX: number;
  maxX: number;
}

/**
 * The first place where rings cross or touch themselves or each other, or null. Corners are whole
 * micrometres within 10 m, so that every turn is told exactly. Edges are gone through from left to
 * right, each against those that reach as far: for a few thousand corners.
 */
export function findCrossing(rings: readonly Ring[]): Crossing | null {
  const edges = rings.flatMap(edgesOf).sort((a, b) => a.minX - b.minX);
  let reaching: Edge[] = [];
  for (const edge of edges) {
    reaching = reaching.filter(({ maxX }) => maxX >= edge.minX);
    for (const other of reaching) {
      const crossing = meeting(other, edge);
      if (crossing) return crossing;
    }
    reaching.push(edge);
  }
  return null;
}

function edgesOf(ring: Ring, number: number): Edge[] {
  const whole = ring.map(({ x, y }) => ({ x: Math.round(x * 1000), y: Math.round(y * 1000) }));
  return whole.map((from, at) => {
    const to = nextCorner(whole, at);
    const [minX, maxX] = from.x < to.x ? [from.x, to.x] : [to.x, from.x];
    return { ring: number, at, last: ring.length - 1, from, to, minX, maxX };
  });
}

function meeting(a: Edge, b: Edge): Crossing | null {
  if (Math.max(a.from.y, a.to.y) < Math.min(b.from.y, b.to.y)) return null;
  if (Math.min(a.from.y, a.to.y) > Math.max(b.from.y, b.to.y)) return null;
  if (follows(a, b)) return doublesBack(a, b) ? touching(a, b, b.from) : null;
  if (follows(b, a)) return doublesBack(b, a) ? touching(a, b, a.from) : null;
  const [fromB, toB] = [turn(b.from, b.to, a.from), turn(b.from, b.to, a.to)];
  const [fromA, toA] = [turn(a.from, a.to, b.from), turn(a.from, a.to, b.to)];
  if (fromB * toB < 0 && fromA * toA < 0) {
    return found('crosses', a, b, along(a, fromB / (fromB - toB)));
  }
  if (toB === 0 && isBetween(b, a.to)) return touching(a, b, a.to);
  if (fromB === 0 && isBetween(b, a.from)) return touching(a, b, a.from);
  if (toA === 0 && isBetween(a, b.to)) return touching(a, b, b.to);
  return fromA === 0 && isBetween(a, b.from) ? touching(a, b, b.from) : null;
}

const follows = (first: Edge, then: Edge): boolean =>
  first.ring === then.ring && then.at === (first.at === first.last ? 0 : first.at + 1);

function doublesBack({ from, to }: Edge, then: Edge): boolean {
  if (turn(from, to, then.to) !== 0) return false;
  return (to.x - from.x) * (then.to.x - to.x) + (to.y - from.y) * (then.to.y - to.y) < 0;
}

/** Positive when `point` lies left of the way from `from` to `to`; zero on it. */
const turn = (from: Point, to: Point, point: Point): number =>
  (to.x - from.x) * (point.y - from.y) - (to.y - from.y) * (point.x - from.x);

const isBetween = ({ from, to }: Edge, { x, y }: Point): boolean =>
  (x - from.x) * (x - to.x) <= 0 && (y - from.y) * (y - to.y) <= 0;

const along = ({ from, to }: Edge, share: number): Point => ({
  x: from.x + (to.x - from.x) * share,
  y: from.y + (to.y - from.y) * share,
});

const touching = (a: Edge, b: Edge, at: Point): Crossing => found('touches', a, b, at);

function found(how: Crossing['how'], a: Edge, b: Edge, { x, y }: Point): Crossing {
  return { how, x: x / 1000, y: y / 1000, rings: [a.ring, b.ring] };
}
