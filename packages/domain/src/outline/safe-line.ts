import { InvalidInput } from '../errors/domain-error.ts';
import { centredHoles } from './drawn-polygon.ts';
import type { Outline, Point } from './outline.ts';
import { outlinePolygon } from './polygon.ts';
import { nextCorner, type Ring, ringBounds } from './ring.ts';

/** How much nearer to a cut a point of the line may come, in mm: curves are followed as closely. */
const slack = 0.005;

/**
 * The line inside an outline that keeps the same distance from every cut, holes included: artwork
 * that stays within it is safe from a die that is a little off. Given in pieces, in mm; none where
 * the outline is too narrow for it.
 * @param marginMm 0.1 to 100
 * @throws InvalidInput
 */
export function safeLine(outline: Outline, marginMm: number): Point[][] {
  if (!(marginMm >= 0.1 && marginMm <= 100)) {
    throw new InvalidInput('safeMarginMm', 'Write the safe margin as 0.1 to 100 mm.');
  }
  const holes = outline.shape === 'polygon' ? centredHoles(outline) : [];
  const rings = [outlinePolygon(outline), ...holes];
  const { minX, minY, maxX, maxY } = ringBounds(rings[0] as Ring);
  if (Math.min(maxX - minX, maxY - minY) <= 2 * marginMm) return [];
  const isFree = freeOf(rings, marginMm - slack);
  return chained(splitAtMeetings(rings.flatMap((ring) => movedIn(ring, marginMm))).filter(isFree));
}

interface Piece {
  from: Point;
  to: Point;
}

/** Every edge moved to its left, where the leather is, with arcs around the corners that stick into it. */
function movedIn(ring: Ring, by: number): Piece[] {
  return ring.flatMap((from, at) => {
    const to = nextCorner(ring, at);
    const after = nextCorner(ring, (at + 1) % ring.length);
    const [angle, next] = [directionOf(from, to), directionOf(to, after)];
    const straight = { from: beside(from, angle, by), to: beside(to, angle, by) };
    const turn = Math.atan2(Math.sin(next - angle), Math.cos(next - angle));
    return turn >= 0 ? [straight] : [straight, ...around(to, angle, turn, by)];
  });
}

const directionOf = (from: Point, to: Point): number => Math.atan2(to.y - from.y, to.x - from.x);

const beside = ({ x, y }: Point, direction: number, by: number): Point => ({
  x: x - by * Math.sin(direction),
  y: y + by * Math.cos(direction),
});

function around(corner: Point, direction: number, turn: number, by: number): Piece[] {
  const count = Math.ceil(Math.abs(turn) / (2 * Math.acos(1 - slack / 2 / by)));
  const at = (share: number) => beside(corner, direction + turn * share, by);
  return Array.from({ length: count }, (_, step) => ({
    from: at(step / count),
    to: at((step + 1) / count),
  }));
}

/** Cut where they cross, so that each piece is wholly far enough from every cut, or too near. */
function splitAtMeetings(pieces: readonly Piece[]): Piece[] {
  const order = pieces.map((piece, at) => ({ at, ...extentOf(piece) }));
  order.sort((a, b) => a.minX - b.minX);
  const shares: number[][] = pieces.map(() => [0, 1]);
  let reaching: typeof order = [];
  for (const one of order) {
    reaching = reaching.filter(({ maxX }) => maxX >= one.minX);
    for (const other of reaching) {
      if (other.maxY < one.minY || other.minY > one.maxY) continue;
      const met = meeting(pieces[one.at] as Piece, pieces[other.at] as Piece);
      if (!met) continue;
      shares[one.at]?.push(met[0]);
      shares[other.at]?.push(met[1]);
    }
    reaching.push(one);
  }
  return pieces.flatMap((piece, at) => parts(piece, shares[at] as number[]));
}

const extentOf = ({ from, to }: Piece) => ({
  minX: Math.min(from.x, to.x),
  maxX: Math.max(from.x, to.x),
  minY: Math.min(from.y, to.y),
  maxY: Math.max(from.y, to.y),
});

/** The shares of both at which they cross, or null. */
function meeting(a: Piece, b: Piece): [number, number] | null {
  const [ux, uy] = [a.to.x - a.from.x, a.to.y - a.from.y];
  const [vx, vy] = [b.to.x - b.from.x, b.to.y - b.from.y];
  const [wx, wy] = [b.from.x - a.from.x, b.from.y - a.from.y];
  const across = ux * vy - uy * vx;
  if (across === 0) return null;
  const [s, t] = [(wx * vy - wy * vx) / across, (wx * uy - wy * ux) / across];
  return s > 0 && s < 1 && t > 0 && t < 1 ? [s, t] : null;
}

function parts({ from, to }: Piece, shares: number[]): Piece[] {
  const at = (share: number) => ({
    x: from.x + (to.x - from.x) * share,
    y: from.y + (to.y - from.y) * share,
  });
  const sorted = [...shares].sort((a, b) => a - b);
  return sorted
    .slice(1)
    .map((share, step) => ({ from: at(sorted[step] as number), to: at(share) }))
    .filter((part) => lengthOf(part) > 1e-6);
}

const lengthOf = ({ from, to }: Piece): number => Math.hypot(to.x - from.x, to.y - from.y);

/** Whether the middle of a piece is so far from every cut. (An edge moved in cannot leave the leather by less.) */
function freeOf(rings: readonly Ring[], least: number): (piece: Piece) => boolean {
  const edges = rings.flatMap((ring) =>
    ring.map((from, at) => ({ from, to: nextCorner(ring, at) })),
  );
  return ({ from, to }) => {
    const middle = { x: (from.x + to.x) / 2, y: (from.y + to.y) / 2 };
    return isInside(edges, middle) && edges.every((edge) => distance(middle, edge) >= least);
  };
}

/** In the outline and in no hole: a line to the right crosses an odd number of edges. */
function isInside(edges: readonly Piece[], { x, y }: Point): boolean {
  let inside = false;
  for (const { from, to } of edges) {
    if (from.y > y === to.y > y) continue;
    if (x < from.x + ((y - from.y) / (to.y - from.y)) * (to.x - from.x)) inside = !inside;
  }
  return inside;
}

function distance({ x, y }: Point, { from, to }: Piece): number {
  const [dx, dy] = [to.x - from.x, to.y - from.y];
  const along = ((x - from.x) * dx + (y - from.y) * dy) / (dx * dx + dy * dy || 1);
  const share = Math.min(1, Math.max(0, along));
  return Math.hypot(x - from.x - share * dx, y - from.y - share * dy);
}

/** Pieces that follow each other become one line; the first and last of a ring as well. */
function chained(pieces: readonly Piece[]): Point[][] {
  const lines: Point[][] = [];
  for (const { from, to } of pieces) {
    const line = lines.at(-1);
    if (line && meets(line.at(-1), from)) line.push(to);
    else lines.push([from, to]);
  }
  return lines;
}

const meets = (a: Point | undefined, b: Point): boolean =>
  a !== undefined && Math.hypot(a.x - b.x, a.y - b.y) < 0.01;
