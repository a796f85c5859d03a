import type { Point } from '../outline/outline.ts';
import type { Ring } from './problem.ts';
import { cornerAt, distanceToEdges, inset, isInside } from './ring.ts';

/** A ring of at most so many corners around (all but around) the given one, for a first look. */
export function thinnedAround(ring: Ring, most: number): Point[] {
  if (ring.length <= most) return [...ring];
  const kept = thinned(ring, most);
  const outside = ring.filter(({ x, y }) => !isInside([kept], x, y));
  const farthest = Math.max(0, ...outside.map(({ x, y }) => distanceToEdges([kept], x, y)));
  return inset(kept, -farthest);
}

function thinned(ring: Ring, most: number): Point[] {
  const kept = [...ring];
  while (kept.length > most) {
    const weights = kept.map((_, at) => weightOf(kept, at));
    const limit = [...weights].sort((a, b) => a - b)[Math.ceil((kept.length - most) / 2)] ?? 0;
    let before = false;
    const next = kept.filter((_, at) => {
      before = !before && (weights[at] as number) <= limit;
      return !before;
    });
    if (next.length < 3) break;
    kept.splice(0, kept.length, ...next);
  }
  return kept;
}

/** Area of the triangle that goes when a corner is left out. */
function weightOf(ring: Ring, at: number): number {
  const [a, b, c] = [cornerAt(ring, at - 1), cornerAt(ring, at), cornerAt(ring, at + 1)];
  return Math.abs((b.x - a.x) * (c.y - a.y) - (b.y - a.y) * (c.x - a.x)) / 2;
}
