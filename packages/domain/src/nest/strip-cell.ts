import type { NestPlacement } from './problem.ts';
import { Edges } from './free-cell.ts';
import { type AtLeast, linearStep } from './linear-step.ts';
import { turned } from './ring.ts';
import type { NoFitPair } from './row-frame.ts';

/** One repeat of a strip's pattern: its pieces, and after how many mm they come again. */
export interface StripCell {
  periodMm: number;
  pieces: readonly NestPlacement[];
}

/** What the pieces of a strip must keep clear of. */
export interface StripRules {
  /** clearances of pieces turned by `rot` and, half turned, by `rot` + 180 */
  rot: number;
  same: Edges;
  turned: Edges | null;
  /** least and most y of an upright and of a half-turned piece's origin */
  upright: readonly [number, number];
  halfTurned: readonly [number, number];
}

export function stripEdges(noFit: NoFitPair, rot: number): Pick<StripRules, 'same' | 'turned'> {
  const edges = (rings: NoFitPair['same']) => new Edges(rings.map((ring) => turned(ring, rot)));
  return { same: edges(noFit.same), turned: noFit.turned && edges(noFit.turned) };
}

/** Of many pieces every round takes longer, and fewer must do. */
const roundsFor = (pieces: number): number => Math.max(6, Math.min(30, Math.floor(160 / pieces)));

/**
 * Moves the pieces of one repeat so that it becomes shorter, by linear programmes in which every
 * neighbour stays within a convex free cell.
 */
export function shortened(cell: StripCell, rules: StripRules): StripCell {
  let best = cell;
  const size = rules.same.bounds.maxX;
  let reach = size / 10;
  const mostRounds = roundsFor(cell.pieces.length);
  for (let round = 0; round < mostRounds && reach > size * 1e-6; round += 1) {
    const next = oneStep(best, rules, reach);
    const gain = next ? best.periodMm - next.periodMm : 0;
    if (next && gain > 0) best = next;
    if (gain < best.periodMm * 1e-4) reach /= 4;
  }
  return best;
}

/** Unknowns: the period, then x and y of every piece. */
function oneStep(cell: StripCell, rules: StripRules, reach: number): StripCell | null {
  const size = 1 + 2 * cell.pieces.length;
  const cost = new Array<number>(size).fill(0);
  cost[0] = 1;
  const wishes = [...edgeWishes(cell, rules, size), ...pairWishes(cell, rules, reach, size)];
  const step = linearStep(cost, wishes, reach);
  if (!step) return null;
  const by = (at: number) => step[at] ?? 0;
  return {
    periodMm: cell.periodMm + by(0),
    pieces: cell.pieces.map(({ x, y, rot }, at) => ({
      x: x + by(1 + 2 * at),
      y: y + by(2 + 2 * at),
      rot,
    })),
  };
}

/** How deep, in mm, pieces of a strip reach into what others must have clear; 0 for a sound cell. */
export function cellConflict({ periodMm, pieces }: StripCell, rules: StripRules): number {
  let worst = 0;
  for (const [i, first] of pieces.entries()) {
    for (const [j, second] of pieces.entries()) {
      if (j < i) continue;
      const { edges, sign } = between(first, second, rules);
      if (!edges) continue;
      const [dx, dy] = [sign * (second.x - first.x), sign * (second.y - first.y)];
      const from = Math.ceil((edges.bounds.minX - dx) / periodMm);
      for (let k = from; dx + k * periodMm < edges.bounds.maxX; k += 1) {
        if (i !== j || k > 0) worst = Math.max(worst, edges.depth(dx + k * periodMm, dy));
      }
    }
  }
  return worst;
}

/** Against a half-turned piece, an upright one lies as its mirror image does. */
export function between(first: NestPlacement, second: NestPlacement, rules: StripRules) {
  const alike = first.rot === second.rot;
  return {
    edges: alike ? rules.same : rules.turned,
    sign: alike || first.rot === rules.rot ? 1 : -1,
  };
}

function edgeWishes({ pieces }: StripCell, rules: StripRules, size: number): AtLeast[] {
  return pieces.flatMap(({ y, rot }, at) => {
    const [least, most] = rot === rules.rot ? rules.upright : rules.halfTurned;
    const up = new Array<number>(size).fill(0);
    const down = new Array<number>(size).fill(0);
    up[2 + 2 * at] = 1;
    down[2 + 2 * at] = -1;
    return [
      { by: up, least: least - y },
      { by: down, least: y - most },
    ];
  });
}

function pairWishes(cell: StripCell, rules: StripRules, reach: number, size: number): AtLeast[] {
  const wishes: AtLeast[] = [];
  cell.pieces.forEach((first, i) => {
    cell.pieces.forEach((second, j) => {
      if (j < i) return;
      wishes.push(...wishesOf(cell, rules, reach, size, { first, second, i, j }));
    });
  });
  return wishes;
}

interface Pair {
  first: NestPlacement;
  second: NestPlacement;
  i: number;
  j: number;
}

function wishesOf(
  { periodMm }: StripCell,
  rules: StripRules,
  reach: number,
  size: number,
  { first, second, i, j }: Pair,
): AtLeast[] {
  const { edges, sign } = between(first, second, rules);
  if (!edges) return [];
  const { bounds } = edges;
  const margin = 3 * reach;
  const [dx, dy] = [sign * (second.x - first.x), sign * (second.y - first.y)];
  if (dy < bounds.minY - margin || dy > bounds.maxY + margin) return [];
  const wishes: AtLeast[] = [];
  const from = Math.ceil((bounds.minX - margin - dx) / periodMm);
  for (let k = from; dx + k * periodMm <= bounds.maxX + margin; k += 1) {
    if (i === j && k <= 0) continue;
    const x = dx + k * periodMm;
    for (const { nx, ny, d } of edges.freeCell(x, dy, (3 + Math.abs(k)) * reach)) {
      const by = new Array<number>(size).fill(0);
      by[0] = k * nx;
      if (i !== j) {
        by[1 + 2 * i] = -sign * nx;
        by[2 + 2 * i] = -sign * ny;
        by[1 + 2 * j] = sign * nx;
        by[2 + 2 * j] = sign * ny;
      }
      wishes.push({ by, least: d - nx * x - ny * dy });
    }
  }
  return wishes;
}
