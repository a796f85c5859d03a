import type { Point } from '../outline/outline.ts';
import { type Candidate, fullTurn } from './candidates.ts';
import type { Crystal } from './crystal.ts';
import { type Clearances, crystalWishes, movedCrystal, unknownsOf } from './crystal-wishes.ts';
import { Edges, type HalfPlane } from './free-cell.ts';
import { type AtLeast, linearStep } from './linear-step.ts';
import type { Cellmate } from './phase.ts';
import type { Ring } from './problem.ts';

const mostRounds = 24;

/**
 * Changes a pattern so that chosen pieces of it lie in the room, by linear programmes that lessen
 * how far the farthest one sticks out. Null where they cannot be brought in.
 */
export function fitted(
  { crystal, rot }: Candidate,
  origin: Point,
  chosen: readonly Cellmate[],
  clear: Clearances,
  inside: (rot: number) => Walls,
): State | null {
  const walls = crystal.members.map(({ turn }) => inside(fullTurn(rot + turn)));
  const edge = outermost(chosen);
  let state = { crystal, origin };
  const size = Math.hypot(clear.same.bounds.maxX, clear.same.bounds.maxY);
  let [out, reach] = [farthestOut(state, edge, walls), size / 10];
  for (let round = 0; round < mostRounds && reach > size * 1e-6; round += 1) {
    if (out <= 0) return state;
    const next = oneStep(state, edge, clear, walls, reach);
    const left = next ? farthestOut(next, edge, walls) : Infinity;
    if (next && left < out) {
      // What would take too many rounds is given up.
      if (left > 0 && round > 5 && out - left < out / 40) return null;
      [state, out] = [next, left];
    } else reach /= 4;
  }
  return out <= 0 ? state : null;
}

/** A pattern and where its first piece lies. */
interface State {
  crystal: Crystal;
  origin: Point;
}

/** The walls of a room for one turn of the pieces. */
export interface Walls {
  /** the half planes of a convex part of the room around a place, which may lie outside */
  around(x: number, y: number, reach: number): readonly HalfPlane[];
  /** how far a place lies outside, in mm; 0 or less inside */
  outside(x: number, y: number): number;
}

/** The walls of a room that is an upright box or empty. */
export function boxWalls(rings: readonly Ring[]): Walls {
  const edges = new Edges(rings.map((ring) => [...ring].reverse()));
  const { minX, minY, maxX, maxY } = edges.bounds;
  const planes = [
    { nx: 1, ny: 0, d: minX },
    { nx: -1, ny: 0, d: -maxX },
    { nx: 0, ny: 1, d: minY },
    { nx: 0, ny: -1, d: -maxY },
  ];
  return {
    around: () => planes,
    outside: (x, y) => Math.max(...planes.map(({ nx, ny, d }) => d - nx * x - ny * y)),
  };
}

/** Of all chosen pieces of a member, those that no others surround: the corners of their hull. */
function outermost(chosen: readonly Cellmate[]): Cellmate[] {
  const members = new Map<number, Cellmate[]>();
  for (const mate of chosen) members.set(mate.member, [...(members.get(mate.member) ?? []), mate]);
  return [...members.values()].flatMap(hull);
}

function hull(mates: readonly Cellmate[]): Cellmate[] {
  const sorted = [...mates].sort((a, b) => a.u - b.u || a.v - b.v);
  const half = (points: readonly Cellmate[]) => {
    const kept: Cellmate[] = [];
    for (const point of points) {
      while (kept.length > 1 && !turnsLeft(kept[kept.length - 2], kept[kept.length - 1], point)) {
        kept.pop();
      }
      kept.push(point);
    }
    return kept;
  };
  return [...new Set([...half(sorted), ...half(sorted.reverse())])];
}

function turnsLeft(a: Cellmate | undefined, b: Cellmate | undefined, c: Cellmate): boolean {
  if (!a || !b) return true;
  return (b.u - a.u) * (c.v - a.v) - (b.v - a.v) * (c.u - a.u) > 0;
}

function placeOf({ crystal, origin }: State, { member, u, v }: Cellmate): Point {
  const { along, across, members } = crystal;
  const at = members[member]?.at ?? { x: 0, y: 0 };
  return {
    x: origin.x + at.x + u * along.x + v * across.x,
    y: origin.y + at.y + u * along.y + v * across.y,
  };
}

const farthestOut = (state: State, mates: readonly Cellmate[], walls: readonly Walls[]): number =>
  Math.max(
    ...mates.map((mate) => {
      const { x, y } = placeOf(state, mate);
      return walls[mate.member]?.outside(x, y) ?? Infinity;
    }),
  );

/** Unknowns: the pattern's, then its origin, then how far pieces may stick out. */
function oneStep(
  state: State,
  mates: readonly Cellmate[],
  clear: Clearances,
  walls: readonly Walls[],
  reach: number,
): State | null {
  const inner = unknownsOf(state.crystal);
  const size = inner + 3;
  const out = farthestOut(state, mates, walls);
  const wishes = crystalWishes(state.crystal, clear, reach, size);
  for (const mate of mates) wishes.push(...wallWishes(state, mate, walls, reach, size, out));
  const cost = new Array<number>(size).fill(0);
  cost[inner + 2] = 1;
  const step = linearStep(cost, wishes, reach);
  if (!step) return null;
  return {
    crystal: movedCrystal(state.crystal, step),
    origin: { x: state.origin.x + (step[inner] ?? 0), y: state.origin.y + (step[inner + 1] ?? 0) },
  };
}

/** Inside every wall but for what is still allowed outside. */
function wallWishes(
  state: State,
  mate: Cellmate,
  walls: readonly Walls[],
  reach: number,
  size: number,
  out: number,
): AtLeast[] {
  const { member, u, v } = mate;
  const { x, y } = placeOf(state, mate);
  const moves = (Math.abs(u) + Math.abs(v) + 2) * reach + out;
  return (walls[member]?.around(x, y, moves) ?? []).map(({ nx, ny, d }) => {
    const by = new Array<number>(size).fill(0);
    [by[0], by[1], by[2], by[3]] = [u * nx, u * ny, v * nx, v * ny];
    if (member > 0) [by[2 + 2 * member], by[3 + 2 * member]] = [nx, ny];
    [by[size - 3], by[size - 2], by[size - 1]] = [nx, ny, 1];
    return { by, least: d - nx * x - ny * y - out };
  });
}
