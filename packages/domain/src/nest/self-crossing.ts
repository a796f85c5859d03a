import type { Point } from '../outline/outline.ts';
import { cornerAt } from './ring.ts';
import type { Ring } from './problem.ts';

/** A place where a ring crosses or touches itself, or null. Edges are swept from left to right. */
export function crossingOf(ring: Ring): Point | null {
  const points = ring.filter((point, at) => !isSame(point, cornerAt(ring, at - 1)));
  const repeated = repeatedCorner(points);
  if (repeated) return repeated;
  const left = (at: number) => Math.min(cornerAt(points, at).x, cornerAt(points, at + 1).x);
  const right = (at: number) => Math.max(cornerAt(points, at).x, cornerAt(points, at + 1).x);
  const order = points.map((_, at) => at).sort((a, b) => left(a) - left(b));
  for (let at = 0; at < order.length; at += 1) {
    const first = order[at] as number;
    for (let next = at + 1; next < order.length; next += 1) {
      const second = order[next] as number;
      if (left(second) > right(first)) break;
      const place = meeting(points, first, second);
      if (place) return place;
    }
  }
  return null;
}

const isSame = (a: Point, b: Point): boolean => a.x === b.x && a.y === b.y;

function repeatedCorner(points: Ring): Point | null {
  const seen = new Set<string>();
  for (const point of points) {
    const key = `${point.x} ${point.y}`;
    if (seen.has(key)) return point;
    seen.add(key);
  }
  return null;
}

/** Where two edges that are not neighbours meet, or neighbours lie on each other. */
function meeting(points: Ring, first: number, second: number): Point | null {
  const count = points.length;
  const apart = (second - first + count) % count;
  if (apart === 1) return foldsBack(points, first) ? cornerAt(points, second) : null;
  if (apart === count - 1) return foldsBack(points, second) ? cornerAt(points, first) : null;
  const [a, b] = [cornerAt(points, first), cornerAt(points, first + 1)];
  const [c, d] = [cornerAt(points, second), cornerAt(points, second + 1)];
  const [ca, cb] = [cross(c, d, a), cross(c, d, b)];
  const [ac, ad] = [cross(a, b, c), cross(a, b, d)];
  if (ca * cb > 0 || ac * ad > 0) return null;
  if (ca === cb) return overlapOnLine(a, b, c, d);
  const share = ca / (ca - cb);
  return { x: a.x + share * (b.x - a.x), y: a.y + share * (b.y - a.y) };
}

/** Whether the edge after an edge runs straight back over it. */
function foldsBack(points: Ring, at: number): boolean {
  const [a, b, c] = [cornerAt(points, at), cornerAt(points, at + 1), cornerAt(points, at + 2)];
  const ahead = (b.x - a.x) * (c.x - b.x) + (b.y - a.y) * (c.y - b.y);
  return cross(a, b, c) === 0 && ahead < 0;
}

function overlapOnLine(a: Point, b: Point, c: Point, d: Point): Point | null {
  if (cross(a, b, c) !== 0) return null;
  const along = (p: Point) => (p.x - a.x) * (b.x - a.x) + (p.y - a.y) * (b.y - a.y);
  const [from, to] = [Math.min(along(c), along(d)), Math.max(along(c), along(d))];
  return to < 0 || from > along(b) ? null : c;
}

const cross = (from: Point, to: Point, point: Point): number =>
  (to.x - from.x) * (point.y - from.y) - (to.y - from.y) * (point.x - from.x);
