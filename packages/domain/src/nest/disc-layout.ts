import type { Point } from '../outline/outline.ts';
import type { Middles } from './disc-box.ts';
import { moreDiscs } from './more-discs.ts';
import type { NestPlacement, NestProblem, Ring } from './problem.ts';
import { ringBounds, turned } from './ring.ts';
import { seeded } from './seeded.ts';

interface Watched {
  bound: number;
  onProgress?: (share: number, pieces: number) => void;
  shouldStop?: () => boolean;
}

/** A ring is round when its corners are many and lie this near to one circle, in mm. */
const [fewestCorners, unround] = [24, 0.02];
const mostDiscs = 400;
/** So many tries for a hundred discs; the fewer they are, the less each takes. */
const [tries, mostTries] = [800, 3000];

/**
 * Round pieces on a panel: more of them by pushing apart, where that finds room for one. Null for
 * every other problem, and where nothing is to be gained.
 */
export function discLayout(
  { container, outline, rotations, gap, trim = 0, holes = [] }: NestProblem,
  start: readonly NestPlacement[],
  { bound, onProgress, shouldStop }: Watched,
): NestPlacement[] | null {
  if (container.type !== 'rect' || holes.length > 0 || start.length > mostDiscs) return null;
  if (start.length === 0 || start.length >= bound) return null;
  const rot = rotations === 'free' ? 0 : (rotations[0] ?? 0);
  const disc = discOf(turned(outline, rot));
  if (!disc) return null;
  const edge = trim + disc.radius;
  const box = {
    width: container.w - 2 * edge,
    height: container.h - 2 * edge,
    apart: 2 * disc.radius + gap,
  };
  const turns = Math.min(mostTries, Math.ceil((tries * 100) / start.length));
  let turn = 0;
  const found = moreDiscs(middlesOf(start, outline, edge), box, turns, seeded(7), (count) => {
    turn += 1;
    onProgress?.(turn / turns, count);
    return count >= bound || shouldStop?.() === true;
  });
  return Array.from(found.x, (x, at) => ({
    x: x + edge - disc.middle.x,
    y: (found.y[at] as number) + edge - disc.middle.y,
    rot,
  }));
}

/** The circle around a ring that is round; null for any other. */
function discOf(ring: Ring): { middle: Point; radius: number } | null {
  if (ring.length < fewestCorners) return null;
  const middle = middleOf(ring);
  const radii = ring.map(({ x, y }) => Math.hypot(x - middle.x, y - middle.y));
  const radius = Math.max(...radii);
  return radius - Math.min(...radii) <= unround ? { middle, radius } : null;
}

function middleOf(ring: Ring): Point {
  const { minX, minY, maxX, maxY } = ringBounds([ring]);
  return { x: (minX + maxX) / 2, y: (minY + maxY) / 2 };
}

function middlesOf(placements: readonly NestPlacement[], outline: Ring, edge: number): Middles {
  const middles = placements.map(({ x, y, rot }) => {
    const middle = middleOf(turned(outline, rot));
    return { x: x + middle.x - edge, y: y + middle.y - edge };
  });
  return {
    x: Float64Array.from(middles, ({ x }) => x),
    y: Float64Array.from(middles, ({ y }) => y),
  };
}
