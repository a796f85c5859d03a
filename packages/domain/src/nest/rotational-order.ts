import type { Point } from '../outline/outline.ts';
import { cornerAt, turned } from './ring.ts';
import type { Ring } from './problem.ts';

/** In how many ways an outline may be turned about its middle and look (all but) the same. */
export function rotationalOrder(ring: Ring): number {
  const middle = { x: meanOf(ring, 'x'), y: meanOf(ring, 'y') };
  const centred = ring.map(({ x, y }) => ({ x: x - middle.x, y: y - middle.y }));
  const size = Math.max(...centred.map(({ x, y }) => Math.hypot(x, y)));
  for (let order = ring.length; order > 1; order -= 1) {
    if (ring.length % order === 0 && isSame(centred, order, size * 1e-5)) return order;
  }
  return 1;
}

const meanOf = (ring: Ring, axis: keyof Point): number =>
  ring.reduce((sum, point) => sum + point[axis], 0) / ring.length;

function isSame(ring: Ring, order: number, tolerance: number): boolean {
  const steps = ring.length / order;
  return turned(ring, 360 / order).every(({ x, y }, at) => {
    const other = cornerAt(ring, at + steps);
    return Math.hypot(other.x - x, other.y - y) <= tolerance;
  });
}
