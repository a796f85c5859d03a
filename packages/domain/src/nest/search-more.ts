import type { Surroundings } from './layout-state.ts';
import type { NestPlacement } from './problem.ts';
import { ringBounds } from './ring.ts';
import { seeded } from './seeded.ts';
import { parted } from './squeeze.ts';

export interface SearchEffort {
  budget: number;
  /** no layout has more pieces */
  bound: number;
  onProgress?: (share: number, pieces: number) => void;
  shouldStop?: () => boolean;
}

/** So many pieces around a new one may make way for it. */
const mostMovable = 11;
const samples = 900;

/** Brings one piece after another into a layout where others can make way for it. */
export function searchMore(
  seed: readonly NestPlacement[],
  rots: readonly number[],
  around: Surroundings,
  { budget, bound, onProgress, shouldStop }: SearchEffort,
): NestPlacement[] {
  const chance = seeded(11);
  let layout = [...seed];
  let places: Place[] = [];
  for (let turn = 0; turn < budget; turn += 1) {
    if (layout.length >= bound || shouldStop?.()) break;
    onProgress?.(turn / budget, layout.length);
    if (places.length === 0) places = likelyPlaces(layout, rots, around, chance);
    const place = places.shift();
    if (!place) break;
    const more = broughtIn(place.at, layout, around);
    if (more) {
      layout = more;
      places = [];
    }
  }
  return layout;
}

interface Place {
  at: NestPlacement;
  /** how deep it reaches into others there, in mm, all in all */
  conflict: number;
}

/** Places where a piece would be least in the way, spread over the room. */
function likelyPlaces(
  layout: readonly NestPlacement[],
  rots: readonly number[],
  around: Surroundings,
  chance: () => number,
): Place[] {
  const places = rots.flatMap((rot) => {
    const free = around.room.free(rot);
    const { minX, minY, maxX, maxY } = ringBounds(free);
    const found: Place[] = [];
    for (let turn = 0; turn < samples; turn += 1) {
      const at = { x: minX + (maxX - minX) * chance(), y: minY + (maxY - minY) * chance(), rot };
      if (around.outside(at) > 0) continue;
      found.push({ at, conflict: conflictOf(at, layout, around) });
    }
    return found;
  });
  places.sort((a, b) => a.conflict - b.conflict);
  const spread: Place[] = [];
  for (const place of places) {
    const near = spread.some(
      ({ at }) => Math.hypot(at.x - place.at.x, at.y - place.at.y) < around.reach / 8,
    );
    if (!near) spread.push(place);
    if (spread.length === 40) break;
  }
  return spread;
}

function conflictOf(at: NestPlacement, layout: readonly NestPlacement[], around: Surroundings) {
  let sum = 0;
  for (const other of layout) sum += around.depth(other, at);
  return sum;
}

function broughtIn(
  at: NestPlacement,
  layout: readonly NestPlacement[],
  around: Surroundings,
): NestPlacement[] | null {
  const order = layout
    .map((piece) => ({ piece, far: Math.hypot(piece.x - at.x, piece.y - at.y) }))
    .sort((a, b) => a.far - b.far);
  const movable = order.slice(0, mostMovable).map(({ piece }) => piece);
  const rest = order.slice(mostMovable).map(({ piece }) => piece);
  const near = rest.filter((piece) =>
    movable.some(({ x, y }) => Math.hypot(piece.x - x, piece.y - y) < around.reach * 1.3),
  );
  const moved = parted([at, ...movable], near, around);
  return moved && [...rest, ...moved];
}
