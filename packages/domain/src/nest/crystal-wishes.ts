import { type Crystal, repeatsWithin } from './crystal.ts';
import { Edges } from './free-cell.ts';
import type { AtLeast } from './linear-step.ts';
import type { NoFitPair } from './row-frame.ts';
import { turned } from './ring.ts';

/** What a pattern's pieces must keep clear of each other, made ready for many looks. */
export interface Clearances {
  same: Edges;
  turned: Edges | null;
}

/** @param rot by how much the pattern's upright pieces are turned */
export function clearances(noFit: NoFitPair, rot = 0): Clearances {
  const edges = (rings: NoFitPair['same']) => new Edges(rings.map((ring) => turned(ring, rot)));
  return { same: edges(noFit.same), turned: noFit.turned && edges(noFit.turned) };
}

/** Unknowns of a pattern's shape: its two steps, then the places of all members but the first. */
export const unknownsOf = ({ members }: Crystal): number => 4 + 2 * (members.length - 1);

/** The pattern after its unknowns have changed by so much. */
export function movedCrystal({ along, across, members }: Crystal, by: readonly number[]): Crystal {
  const change = (at: number) => by[at] ?? 0;
  return {
    along: { x: along.x + change(0), y: along.y + change(1) },
    across: { x: across.x + change(2), y: across.y + change(3) },
    members: members.map(({ turn, at }, member) => ({
      turn,
      at:
        member === 0 ? at : { x: at.x + change(2 + 2 * member), y: at.y + change(3 + 2 * member) },
    })),
  };
}

/** That all pieces stay within convex free cells of each other, for changes up to `reach` each. */
export function crystalWishes(
  crystal: Crystal,
  clear: Clearances,
  reach: number,
  size: number,
): AtLeast[] {
  const wishes: AtLeast[] = [];
  crystal.members.forEach((_, i) => {
    crystal.members.forEach((__, j) => {
      if (j >= i) addPair(wishes, crystal, clear, reach, size, i, j);
    });
  });
  return wishes;
}

function addPair(
  wishes: AtLeast[],
  crystal: Crystal,
  clear: Clearances,
  reach: number,
  size: number,
  i: number,
  j: number,
): void {
  const [first, second] = [crystal.members[i], crystal.members[j]];
  if (!first || !second) return;
  const edges = first.turn === second.turn ? clear.same : clear.turned;
  if (!edges) return;
  // Against a half-turned piece, an upright one lies as its mirror image does.
  const sign = first.turn !== second.turn && first.turn === 180 ? -1 : 1;
  const from = { x: sign * (second.at.x - first.at.x), y: sign * (second.at.y - first.at.y) };
  for (const { u, v, x, y } of repeatsWithin(crystal, from, edges.bounds, 4 * reach)) {
    // Of two opposite repeats one is enough.
    if (i === j && (v < 0 || (v === 0 && u <= 0))) continue;
    const moves = (Math.abs(u) + Math.abs(v) + (i === j ? 0 : 2)) * reach * Math.SQRT2 + 1e-6;
    for (const { nx, ny, d } of edges.freeCell(x, y, moves)) {
      const by = new Array<number>(size).fill(0);
      [by[0], by[1], by[2], by[3]] = [u * nx, u * ny, v * nx, v * ny];
      addMember(by, i, -sign * nx, -sign * ny);
      addMember(by, j, sign * nx, sign * ny);
      wishes.push({ by, least: d - nx * x - ny * y });
    }
  }
}

function addMember(by: number[], member: number, x: number, y: number): void {
  if (member === 0) return;
  by[2 + 2 * member] = (by[2 + 2 * member] ?? 0) + x;
  by[3 + 2 * member] = (by[3 + 2 * member] ?? 0) + y;
}
