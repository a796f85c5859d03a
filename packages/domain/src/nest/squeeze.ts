import type { HalfPlane } from './free-cell.ts';
import type { Surroundings } from './layout-state.ts';
import { type AtLeast, linearStep } from './linear-step.ts';
import type { NestPlacement } from './problem.ts';

const mostRounds = 30;
/** Below this depth, in mm, pieces are taken as clear of each other. */
const clearMm = 1e-7;

/**
 * Moves pieces that reach into each other apart, by linear programmes that lessen the deepest
 * conflict; `fixed` ones stay. Null where they cannot be parted.
 */
export function parted(
  movable: readonly NestPlacement[],
  fixed: readonly NestPlacement[],
  around: Surroundings,
): NestPlacement[] | null {
  let pieces = [...movable];
  let worst = deepest(pieces, fixed, around);
  let reach = around.reach / 8;
  for (let round = 0; round < mostRounds; round += 1) {
    if (worst <= clearMm) return pieces;
    const next = oneStep(pieces, fixed, around, reach, worst);
    const left = next ? deepest(next, fixed, around) : Infinity;
    if (next && left < worst) {
      if (left > clearMm && round > 4 && left > 0.9 * worst) return null;
      [pieces, worst] = [next, left];
    } else {
      reach /= 3;
      if (reach < around.reach * 1e-4) return null;
    }
  }
  return worst <= clearMm ? pieces : null;
}

function deepest(
  pieces: readonly NestPlacement[],
  fixed: readonly NestPlacement[],
  around: Surroundings,
): number {
  let worst = 0;
  pieces.forEach((piece, at) => {
    worst = Math.max(worst, around.outside(piece));
    for (const other of fixed) worst = Math.max(worst, around.depth(piece, other));
    for (let next = at + 1; next < pieces.length; next += 1) {
      worst = Math.max(worst, around.depth(piece, pieces[next] as NestPlacement));
    }
  });
  return worst;
}

/** Unknowns: x and y of every piece, then how deep conflicts may be. */
function oneStep(
  pieces: readonly NestPlacement[],
  fixed: readonly NestPlacement[],
  around: Surroundings,
  reach: number,
  worst: number,
): NestPlacement[] | null {
  const size = 2 * pieces.length + 1;
  const wishes: AtLeast[] = [];
  const add = (plane: HalfPlane, x: number, y: number, i: number, j: number) => {
    const by = new Array<number>(size).fill(0);
    [by[2 * i], by[2 * i + 1]] = [plane.nx, plane.ny];
    if (j >= 0) [by[2 * j], by[2 * j + 1]] = [-plane.nx, -plane.ny];
    by[size - 1] = 1;
    wishes.push({ by, least: plane.d - plane.nx * x - plane.ny * y - worst });
  };
  pieces.forEach((piece, i) => {
    for (const plane of wallPlanes(piece, around, 3 * reach)) add(plane, piece.x, piece.y, i, -1);
    for (const other of fixed) {
      const [x, y] = [piece.x - other.x, piece.y - other.y];
      for (const plane of pairPlanes(other, piece, around, 1.5 * reach)) add(plane, x, y, i, -1);
    }
    for (let j = 0; j < i; j += 1) {
      const other = pieces[j] as NestPlacement;
      const [x, y] = [piece.x - other.x, piece.y - other.y];
      for (const plane of pairPlanes(other, piece, around, 3 * reach)) add(plane, x, y, i, j);
    }
  });
  const cost = new Array<number>(size).fill(0);
  cost[size - 1] = 1;
  const step = linearStep(cost, wishes, reach);
  if (!step) return null;
  return pieces.map(({ x, y, rot }, at) => ({
    x: x + (step[2 * at] ?? 0),
    y: y + (step[2 * at + 1] ?? 0),
    rot,
  }));
}

function wallPlanes(piece: NestPlacement, around: Surroundings, reach: number): HalfPlane[] {
  const walls = around.walls(piece.rot);
  const out = around.outside(piece);
  return out > 0 ? [walls.wayOut(piece.x, piece.y)] : walls.freeCell(piece.x, piece.y, reach);
}

function pairPlanes(
  from: NestPlacement,
  to: NestPlacement,
  around: Surroundings,
  reach: number,
): HalfPlane[] {
  const [x, y] = [to.x - from.x, to.y - from.y];
  if (Math.max(Math.abs(x), Math.abs(y)) > around.reach + reach) return [];
  const edges = around.noFit(from.rot, to.rot);
  const { minX, minY, maxX, maxY } = edges.bounds;
  if (x < minX - reach || x > maxX + reach || y < minY - reach || y > maxY + reach) return [];
  return edges.isInside(x, y) ? [edges.wayOut(x, y)] : edges.freeCell(x, y, reach);
}
