import type { Bounds, Point } from './outline.ts';

/** A closed curve by its corners, of which the last is joined to the first. */
export type Ring = readonly Point[];

/** The corner after this one, going round. */
export function nextCorner(ring: Ring, at: number): Point {
  return ring[at + 1 === ring.length ? 0 : at + 1] as Point;
}

/** Twice summed and halved, about the first corner: positive when counter-clockwise. In mm². */
export function ringArea(ring: Ring): number {
  const origin = ring[0] ?? { x: 0, y: 0 };
  let sum = 0;
  ring.forEach((from, at) => {
    const to = nextCorner(ring, at);
    sum += (from.x - origin.x) * (to.y - origin.y) - (to.x - origin.x) * (from.y - origin.y);
  });
  return sum / 2;
}

export function ringLength(ring: Ring): number {
  return ring.reduce((sum, from, at) => {
    const to = nextCorner(ring, at);
    return sum + Math.hypot(to.x - from.x, to.y - from.y);
  }, 0);
}

export function ringBounds(ring: Ring): Bounds {
  const bounds = { minX: Infinity, minY: Infinity, maxX: -Infinity, maxY: -Infinity };
  for (const { x, y } of ring) {
    bounds.minX = Math.min(bounds.minX, x);
    bounds.minY = Math.min(bounds.minY, y);
    bounds.maxX = Math.max(bounds.maxX, x);
    bounds.maxY = Math.max(bounds.maxY, y);
  }
  return bounds;
}

/** Whether a point lies inside, by counting the edges that a line to the right of it crosses. */
export function ringContains(ring: Ring, { x, y }: Point): boolean {
  let inside = false;
  ring.forEach((from, at) => {
    const to = nextCorner(ring, at);
    if (from.y > y === to.y > y) return;
    if (x < from.x + ((y - from.y) / (to.y - from.y)) * (to.x - from.x)) inside = !inside;
  });
  return inside;
}

/** The same ring, counter-clockwise or clockwise. */
export function turnedRing(ring: Ring, way: 'counter-clockwise' | 'clockwise'): Point[] {
  const asWanted = ringArea(ring) > 0 === (way === 'counter-clockwise');
  return asWanted ? [...ring] : [...ring].reverse();
}

// Rounding the size and putting the sign back keeps an outline that is symmetrical symmetrical.
const micrometre = (value: number): number =>
  (Math.sign(value) * Math.round(Math.abs(value) * 1000)) / 1000 + 0;

export const toMicrometre = ({ x, y }: Point): Point => ({ x: micrometre(x), y: micrometre(y) });

/** Leaves out corners that repeat the one before them. */
export function withoutRepeats(points: Ring): Point[] {
  return points.filter((point, at) => {
    const before = points[(at + points.length - 1) % points.length];
    return before === undefined || point.x !== before.x || point.y !== before.y;
  });
}
