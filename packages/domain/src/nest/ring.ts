import type { Bounds, Point } from '../outline/outline.ts';
import type { Ring } from './problem.ts';

/** The point at an index that wraps around the ring. */
export function cornerAt(ring: Ring, at: number): Point {
  return ring[((at % ring.length) + ring.length) % ring.length] as Point;
}

/** Area in mm²: positive where the ring runs counter-clockwise. */
export function signedArea(ring: Ring): number {
  let twice = 0;
  let before = ring[ring.length - 1];
  for (const point of ring) {
    if (before) twice += before.x * point.y - point.x * before.y;
    before = point;
  }
  return twice / 2;
}

export function counterClockwise(ring: Ring): Ring {
  return signedArea(ring) < 0 ? [...ring].reverse() : ring;
}

export function ringBounds(rings: readonly Ring[]): Bounds {
  const bounds = { minX: Infinity, minY: Infinity, maxX: -Infinity, maxY: -Infinity };
  for (const ring of rings) {
    for (const { x, y } of ring) {
      if (x < bounds.minX) bounds.minX = x;
      if (x > bounds.maxX) bounds.maxX = x;
      if (y < bounds.minY) bounds.minY = y;
      if (y > bounds.maxY) bounds.maxY = y;
    }
  }
  return bounds;
}

export const mirroredThroughOrigin = (ring: Ring): Point[] =>
  ring.map(({ x, y }) => ({ x: -x, y: -y }));

export const shifted = (ring: Ring, dx: number, dy: number): Point[] =>
  ring.map(({ x, y }) => ({ x: x + dx, y: y + dy }));

/** Cosine and sine of an angle in degrees, exact at quarter turns. */
export function direction(degrees: number): Point {
  const turn = ((degrees % 360) + 360) % 360;
  if (turn === 0) return { x: 1, y: 0 };
  if (turn === 90) return { x: 0, y: 1 };
  if (turn === 180) return { x: -1, y: 0 };
  if (turn === 270) return { x: 0, y: -1 };
  return { x: Math.cos((turn * Math.PI) / 180), y: Math.sin((turn * Math.PI) / 180) };
}

/** A point turned about the origin by the angle whose cosine and sine are given. */
export const turnedPoint = ({ x, y }: Point, by: Point): Point => ({
  x: x * by.x - y * by.y,
  y: x * by.y + y * by.x,
});

/** The ring turned counter-clockwise about the origin. */
export function turned(ring: Ring, degrees: number): Point[] {
  const by = direction(degrees);
  return ring.map((point) => turnedPoint(point, by));
}

/** Whether a point lies inside by the even-odd rule; on the boundary either answer is given. */
export function isInside(rings: readonly Ring[], x: number, y: number): boolean {
  let inside = false;
  for (const ring of rings) {
    let from = ring[ring.length - 1] as Point;
    for (const to of ring) {
      if (from.y > y !== to.y > y) {
        if (x < from.x + ((y - from.y) / (to.y - from.y)) * (to.x - from.x)) inside = !inside;
      }
      from = to;
    }
  }
  return inside;
}

/** Distance in mm from a point to the nearest place of the boundary. */
export function distanceToEdges(rings: readonly Ring[], x: number, y: number): number {
  let least = Infinity;
  for (const ring of rings) {
    let from = ring[ring.length - 1] as Point;
    for (const to of ring) {
      least = Math.min(least, squaredToEdge(from, to, x, y));
      from = to;
    }
  }
  return Math.sqrt(least);
}

function squaredToEdge(from: Point, to: Point, x: number, y: number): number {
  const [dx, dy] = [to.x - from.x, to.y - from.y];
  const long = dx * dx + dy * dy;
  const along = long === 0 ? 0 : ((x - from.x) * dx + (y - from.y) * dy) / long;
  const share = along < 0 ? 0 : along > 1 ? 1 : along;
  const [ex, ey] = [x - from.x - share * dx, y - from.y - share * dy];
  return ex * ex + ey * ey;
}

/** Every edge moved inwards by a distance far smaller than any edge is long. */
export function inset(ring: Ring, by: number): Point[] {
  return ring.map((corner, at) => {
    const before = unit(cornerAt(ring, at - 1), corner);
    const after = unit(corner, cornerAt(ring, at + 1));
    const share = by / Math.max(0.05, 1 + before.x * after.x + before.y * after.y);
    return {
      x: corner.x - share * (before.y + after.y),
      y: corner.y + share * (before.x + after.x),
    };
  });
}

function unit(from: Point, to: Point): Point {
  const long = Math.hypot(to.x - from.x, to.y - from.y);
  return { x: (to.x - from.x) / long, y: (to.y - from.y) / long };
}
