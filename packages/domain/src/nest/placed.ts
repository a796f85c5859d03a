import type { Bounds, Point } from '../outline/outline.ts';
import type { NestPlacement, Ring } from './problem.ts';
import { direction, ringBounds, turnedPoint } from './ring.ts';

/** The outline as it lies in the container. */
export function placed(ring: Ring, { x, y, rot }: NestPlacement): Point[] {
  const by = direction(rot);
  return ring.map((point) => {
    const at = turnedPoint(point, by);
    return { x: at.x + x, y: at.y + y };
  });
}

/** The pairs of boxes that come closer to each other than a distance. */
export function* closePairs(rings: readonly Ring[], distance: number): Generator<[number, number]> {
  const boxes = rings.map((ring) => ringBounds([ring]));
  const order = boxes
    .map((_, at) => at)
    .sort((a, b) => (boxes[a] as Bounds).minX - (boxes[b] as Bounds).minX);
  for (let at = 0; at < order.length; at += 1) {
    const first = boxes[order[at] as number] as Bounds;
    for (let next = at + 1; next < order.length; next += 1) {
      const second = boxes[order[next] as number] as Bounds;
      if (second.minX > first.maxX + distance) break;
      if (second.minY > first.maxY + distance || first.minY > second.maxY + distance) continue;
      yield [order[at] as number, order[next] as number];
    }
  }
}
