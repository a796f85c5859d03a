import { areaPerPiece, type Crystal, repeatsWithin } from './crystal.ts';
import { Edges } from './free-cell.ts';
import { type AtLeast, linearStep } from './linear-step.ts';
import type { Ring } from './problem.ts';
import { ringBounds } from './ring.ts';
import type { NoFitPair } from './row-frame.ts';

/** What a pattern's pieces must keep clear of each other, made ready for many looks. */
export interface Clearances {
  same: Edges;
  turned: Edges | null;
  /** no piece farther than this from another matters */
  farthest: number;
}

export function clearances({ same, turned }: NoFitPair): Clearances {
  return {
    same: new Edges(same),
    turned: turned && new Edges(turned),
    farthest: Math.max(reachOf(same), turned ? reachOf(turned) : 0),
  };
}

function reachOf(rings: readonly Ring[]): number {
  const { minX, minY, maxX, maxY } = ringBounds(rings);
  return Math.hypot(Math.max(-minX, maxX), Math.max(-minY, maxY));
}

const mostRounds = 60;

/**
 * Moves a pattern's repeats and its second piece so that the area per piece falls, by linear
 * programmes in which every neighbour stays within a convex free cell: each step can be cut.
 * The members are one piece, or one and another half turned.
 */
export function tightened(crystal: Crystal, clear: Clearances): Crystal {
  let best = crystal;
  let reach = clear.farthest / 12;
  for (let round = 0; round < mostRounds && reach > clear.farthest * 1e-8; round += 1) {
    const next = oneStep(best, clear, reach);
    const gain = next ? areaPerPiece(best) - areaPerPiece(next) : 0;
    if (next && gain > 0) best = next;
    if (gain < areaPerPiece(best) * 1e-4) reach /= 4;
  }
  return best;
}

/** Unknowns: along x, y; across x, y; the second member's place x, y. */
function oneStep(crystal: Crystal, clear: Clearances, reach: number): Crystal | null {
  const { along: a, across: b } = crystal;
  const size = crystal.members.length > 1 ? 6 : 4;
  const cost = [b.y, -b.x, -a.y, a.x, 0, 0].slice(0, size);
  const sign = a.x * b.y - a.y * b.x < 0 ? -1 : 1;
  const wishes = wishesOf(crystal, clear, reach, size);
  const step = linearStep(
    cost.map((each) => each * sign),
    wishes,
    reach,
  );
  return step && moved(crystal, step);
}

function moved({ along, across, members }: Crystal, step: readonly number[]): Crystal {
  const by = (at: number) => step[at] ?? 0;
  return {
    along: { x: along.x + by(0), y: along.y + by(1) },
    across: { x: across.x + by(2), y: across.y + by(3) },
    members: members.map(({ turn, at }, member) => ({
      turn,
      at: member === 0 ? at : { x: at.x + by(4), y: at.y + by(5) },
    })),
  };
}

function wishesOf(crystal: Crystal, clear: Clearances, reach: number, size: number): AtLeast[] {
  const wishes: AtLeast[] = [];
  const second = crystal.members[1];
  const margin = 4 * reach;
  for (const { u, v, x, y } of repeatsWithin(crystal, { x: 0, y: 0 }, clear.same.bounds, margin)) {
    // Of two opposite repeats one is enough.
    if (v < 0 || (v === 0 && u <= 0)) continue;
    addWishes(wishes, clear.same, { u, v, w: 0, x, y }, reach, size);
  }
  if (second && clear.turned) {
    const { bounds } = clear.turned;
    for (const { u, v, x, y } of repeatsWithin(crystal, second.at, bounds, margin)) {
      addWishes(wishes, clear.turned, { u, v, w: 1, x, y }, reach, size);
    }
  }
  return wishes;
}

interface Neighbour {
  u: number;
  v: number;
  w: number;
  x: number;
  y: number;
}

function addWishes(
  wishes: AtLeast[],
  edges: Edges,
  { u, v, w, x, y }: Neighbour,
  reach: number,
  size: number,
): void {
  const moves = (Math.abs(u) + Math.abs(v) + w) * reach * Math.SQRT2 + 1e-6;
  for (const { nx, ny, d } of edges.freeCell(x, y, moves)) {
    const by = [u * nx, u * ny, v * nx, v * ny, w * nx, w * ny].slice(0, size);
    wishes.push({ by, least: d - nx * x - ny * y });
  }
}
