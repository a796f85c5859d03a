import type { Point } from '../outline/outline.ts';
import { commonArea, grown } from '../outline/clip.ts';
import { closePairs, placed } from './placed.ts';
import type { NestPlacement, NestProblem, Ring } from './problem.ts';
import { counterClockwise, distanceToEdges, isInside, ringBounds, signedArea } from './ring.ts';

/** A tenth of what an outside check allows: share of a piece's area, and mm of spacing. */
const overlapShare = 3e-7;
const spacingShort = 2e-4;
const edgeMm = 1e-5;

export interface Fault {
  /** the piece to leave out */
  piece: number;
  what: 'overlaps' | 'too close' | 'outside' | 'over a flaw';
}

/**
 * Looks at a layout with other means than it was made with: areas in common by clipping, distances
 * from edge to edge, corners inside the container and outside the flaws.
 */
export function nestFaults(problem: NestProblem, placements: readonly NestPlacement[]): Fault[] {
  const ring = counterClockwise(problem.outline);
  const rings = placements.map((placement) => placed(ring, placement));
  return [
    ...outsideFaults(problem, rings),
    ...pairFaults(rings, placements, problem.gap, signedArea(ring)),
  ];
}

function pairFaults(
  rings: readonly Ring[],
  placements: readonly NestPlacement[],
  gap: number,
  area: number,
): Fault[] {
  const faults: Fault[] = [];
  // In a regular layout the same two pieces meet over and over.
  const known = new Map<string, Fault['what'] | null>();
  for (const [a, b] of closePairs(rings, gap)) {
    const key = keyOf(placements[a] as NestPlacement, placements[b] as NestPlacement);
    let what = known.get(key);
    if (what === undefined) {
      what = conflict(rings[a] as Ring, rings[b] as Ring, gap, area);
      known.set(key, what);
    }
    if (what) faults.push({ piece: Math.max(a, b), what });
  }
  return faults;
}

const keyOf = (a: NestPlacement, b: NestPlacement): string =>
  [a.rot, b.rot, (b.x - a.x).toFixed(7), (b.y - a.y).toFixed(7)].join(' ');

function conflict(a: Ring, b: Ring, gap: number, area: number): Fault['what'] | null {
  if (gap > 0 && ringDistance(a, b, gap) < gap - spacingShort) return 'too close';
  return commonArea(a, b) > overlapShare * area ? 'overlaps' : null;
}

/** Least distance of corners to edges, looked at only within `near`; 0 does not show overlap. */
function ringDistance(a: Ring, b: Ring, near: number): number {
  return Math.min(cornersToEdges(a, b, near), cornersToEdges(b, a, near));
}

function cornersToEdges(corners: Ring, ring: Ring, near: number): number {
  const { minX, minY, maxX, maxY } = ringBounds([ring]);
  let least = Infinity;
  for (const { x, y } of corners) {
    if (x < minX - near || x > maxX + near || y < minY - near || y > maxY + near) continue;
    least = Math.min(least, distanceToEdges([ring], x, y));
  }
  return least;
}

function outsideFaults(problem: NestProblem, rings: readonly Ring[]): Fault[] {
  const { container, holes = [], trim = 0, flawClearance = 0 } = problem;
  const flaws = grown(holes.map(counterClockwise), flawClearance);
  const edges =
    container.type === 'polygon' ? grown([counterClockwise(container.points)], -trim) : null;
  return rings.flatMap((ring, piece): Fault[] => {
    const outside = edges ? leaves(ring, edges) : leavesBox(ring, problem);
    if (outside) return [{ piece, what: 'outside' }];
    return flaws.some((flaw) => meets(ring, flaw)) ? [{ piece, what: 'over a flaw' }] : [];
  });
}

function leavesBox(ring: Ring, { container, trim = 0 }: NestProblem): boolean {
  const { minX, minY, maxX, maxY } = ringBounds([ring]);
  if (container.type === 'polygon') return false;
  const height = container.type === 'rect' ? container.h : container.width;
  const width = container.type === 'rect' ? container.w : Infinity;
  const least = trim - edgeMm;
  return minX < least || minY < least || maxX > width - least || maxY > height - least;
}

function leaves(ring: Ring, edges: readonly Ring[]): boolean {
  const out = ring.some(
    ({ x, y }) => !isInside(edges, x, y) && distanceToEdges(edges, x, y) > edgeMm,
  );
  return out || edges.some((edge) => reachesIn(edge, ring) || crosses(edge, ring));
}

/** Whether they have more than an edge in common. */
function meets(ring: Ring, flaw: Ring): boolean {
  return reachesIn(flaw, ring) || reachesIn(ring, flaw) || crosses(flaw, ring);
}

/** Whether a corner of one ring lies inside another. */
function reachesIn(corners: Ring, ring: Ring): boolean {
  const { minX, minY, maxX, maxY } = ringBounds([ring]);
  return corners.some(({ x, y }) => {
    if (x < minX || x > maxX || y < minY || y > maxY) return false;
    return isInside([ring], x, y) && distanceToEdges([ring], x, y) > edgeMm;
  });
}

/** Whether an edge passes right through another. */
function crosses(edges: Ring, ring: Ring): boolean {
  const { minX, minY, maxX, maxY } = ringBounds([ring]);
  let from = edges[edges.length - 1] as Point;
  for (const to of edges) {
    const apart =
      Math.max(from.x, to.x) < minX ||
      Math.min(from.x, to.x) > maxX ||
      Math.max(from.y, to.y) < minY ||
      Math.min(from.y, to.y) > maxY;
    if (!apart && crossesAny(from, to, ring)) return true;
    from = to;
  }
  return false;
}

function crossesAny(from: Point, to: Point, ring: Ring): boolean {
  let before = ring[ring.length - 1] as Point;
  for (const after of ring) {
    const straddles = side(from, to, before) * side(from, to, after) < 0;
    if (straddles && side(before, after, from) * side(before, after, to) < 0) return true;
    before = after;
  }
  return false;
}

/** On which side of a line a point lies; 0 within the tolerance. */
function side(from: Point, to: Point, point: Point): number {
  const cross = (to.x - from.x) * (point.y - from.y) - (to.y - from.y) * (point.x - from.x);
  const away = cross / Math.hypot(to.x - from.x, to.y - from.y);
  return Math.abs(away) < edgeMm ? 0 : Math.sign(away);
}
