import { type Candidates, fullTurn } from './candidates.ts';
import { areaPerPiece, type Crystal } from './crystal.ts';
import { clearances, type Clearances } from './crystal-wishes.ts';
import { boxWalls, fitted } from './fit-room.ts';
import { PhaseSearch } from './phase.ts';
import type { Ring } from './problem.ts';
import { ringBounds } from './ring.ts';
import type { Room } from './room.ts';
import type { Shape } from './shape.ts';

/** A pattern as it lies in the container. */
export interface Seed {
  crystal: Crystal;
  rot: number;
}

/** By how much of a piece's size a panel is thought larger, to see which patterns all but give more. */
const growths = [0.01, 0.02, 0.04];
const largestGrowth = 0.07;
const mostTried = 12;

/** Patterns that would give more on a slightly larger panel, changed so that they do on this one. */
export function fitMore(
  candidates: Candidates,
  shape: Shape,
  room: Room,
  pool: readonly Seed[],
): void {
  const clear = new Map<number, Clearances>();
  const clearFor = (rot: number) => {
    const known = clear.get(rot) ?? clearances(shape.noFit, rot);
    clear.set(rot, known);
    return known;
  };
  const walls = (rot: number) => boxWalls(room.free(rot));
  for (const near of nearMisses(candidates.most, shape, room, pool)) {
    if (near.count <= candidates.most) continue;
    const { crystal, rot, search, phase } = near;
    const { along, across } = crystal;
    const origin = {
      x: phase.u * along.x + phase.v * across.x,
      y: phase.u * along.y + phase.v * across.y,
    };
    const found = fitted(
      { crystal, rot, phase },
      origin,
      search.mates(phase),
      clearFor(rot),
      walls,
    );
    if (!found) continue;
    const { along: a, across: b } = found.crystal;
    const cross = a.x * b.y - a.y * b.x;
    const v = (a.x * found.origin.y - a.y * found.origin.x) / cross;
    candidates.consider(found.crystal, rot, 0, [v]);
  }
}

/** Patterns that give more than `most` on a slightly larger panel, the least growth first. */
export function nearMisses(most: number, shape: Shape, room: Room, pool: readonly Seed[]) {
  const size = Math.sqrt(shape.areaMm2);
  const densest = [...pool].sort((a, b) => areaPerPiece(a.crystal) - areaPerPiece(b.crystal));
  const seen = new Set<string>();
  const found = densest.slice(0, 150).flatMap((seed) => {
    const free = seed.crystal.members.map(({ turn }) => room.free(fullTurn(seed.rot + turn)));
    const within = (growth: number) => {
      const larger = free.map((rings) => rings.map((ring) => largerBox(ring, growth * size)));
      const search = new PhaseSearch(seed.crystal, larger);
      const phase = search.best(4);
      return { ...seed, search, phase, count: phase.count, growth };
    };
    const widest = within(largestGrowth);
    const key = `${widest.count} ${areaPerPiece(seed.crystal).toFixed(1)}`;
    if (widest.count <= most || seen.has(key)) return [];
    seen.add(key);
    return [growths.map(within).find(({ count }) => count > most) ?? widest];
  });
  return found.sort((a, b) => a.growth - b.growth || b.count - a.count).slice(0, mostTried);
}

function largerBox(ring: Ring, by: number): Ring {
  const { minX, minY, maxX, maxY } = ringBounds([ring]);
  return [
    { x: minX - by, y: minY - by },
    { x: maxX + by, y: minY - by },
    { x: maxX + by, y: maxY + by },
    { x: minX - by, y: maxY + by },
  ];
}
