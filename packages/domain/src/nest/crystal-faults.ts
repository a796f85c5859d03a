import { type Crystal, type Member, repeatsWithin } from './crystal.ts';
import { distanceToEdges, isInside, ringBounds } from './ring.ts';
import type { NoFitPair } from './row-frame.ts';
import type { Ring } from './problem.ts';

/**
 * How deep, in mm, the pieces of a pattern reach into each other's no-fit polygon at worst; 0 where
 * the pattern can be cut. `noFit` lies as the pattern does.
 */
export function deepestConflict(crystal: Crystal, noFit: NoFitPair): number {
  let worst = 0;
  for (const first of crystal.members) {
    for (const second of crystal.members) {
      worst = Math.max(worst, conflictOf(crystal, first, second, noFit));
    }
  }
  return worst;
}

function conflictOf(crystal: Crystal, first: Member, second: Member, noFit: NoFitPair): number {
  const rings = ringsFor(first, second, noFit);
  const [dx, dy] = [second.at.x - first.at.x, second.at.y - first.at.y];
  let worst = 0;
  for (const { x, y } of repeatsWithin(crystal, { x: dx, y: dy }, ringBounds(rings), 0)) {
    if (first === second && Math.abs(x) + Math.abs(y) < 1e-9) continue;
    if (isInside(rings, x, y)) worst = Math.max(worst, distanceToEdges(rings, x, y));
  }
  return worst;
}

/** The no-fit polygon of the second member against the first, both as they lie. */
function ringsFor(first: Member, second: Member, noFit: NoFitPair): readonly Ring[] {
  if (first.turn === second.turn) return noFit.same;
  const turned = noFit.turned ?? [];
  return first.turn === 0
    ? turned
    : turned.map((ring) => ring.map(({ x, y }) => ({ x: -x, y: -y })));
}
