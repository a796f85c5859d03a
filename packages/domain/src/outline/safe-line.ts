import { InvalidInput } from '../errors/domain-error.ts';
import { centredHoles } from './drawn-polygon.ts';
import { along, lengthOf, nearSides, type PassesWithin, type Side } from './near-edges.ts';
import type { Outline, Point } from './outline.ts';
import { outlinePolygon } from './polygon.ts';
import { nextCorner, type Ring, ringBounds, ringLength } from './ring.ts';

/** What arithmetic loses, in mm. */
const slack = 1e-6;
/** By how much the line may bulge around a corner that sticks into the leather, in mm. */
const bulge = 0.005;

/**
 * The line inside an outline that keeps the same distance from every cut, holes included: artwork
 * that stays within it is safe from a die that is a little off. Given in pieces, in mm; none where
 * the outline is too narrow for it, or so crinkled that no artwork could follow it.
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
  const least = marginMm - slack;
  if (rings.reduce((sum, ring) => sum + ringLength(ring), 0) > mostSteps * least) return [];
  const sides = rings.flatMap((ring) =>
    ring.map((from, at) => ({ from, to: nextCorner(ring, at) })),
  );
  const passes = nearSides(sides, least);
  const moved = rings.flatMap((ring) => movedIn(ring, marginMm));
  const hopeful = moved.flatMap((side) => steps(side, marginMm)).filter(mayBeFree(passes, least));
  if (hopeful.length > mostPieces) return [];
  return chained(splitAtMeetings(hopeful).filter(isFree(sides, passes, least)));
}

/** How many times the margin all edges may be long together. */
const mostSteps = 100_000;
const mostPieces = 10_000;

function steps(side: Side, length: number): Side[] {
  const count = Math.ceil(lengthOf(side) / length);
  return Array.from({ length: count }, (_, at) => ({
    from: along(side, at / count),
    to: along(side, (at + 1) / count),
  }));
}

/** Whether any of a step may be far enough from every cut: nothing in it is farther than its middle and half of it. */
const mayBeFree = (passes: PassesWithin, least: number) => (step: Side) =>
  !passes(along(step, 0.5), least - lengthOf(step) / 2);

/** Every edge moved to its left, where the leather is, with arcs around the corners that stick into it. */
function movedIn(ring: Ring, by: number): Side[] {
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

/** Chords around the arc, not within it, so that they come nowhere nearer to the corner. */
function around(corner: Point, direction: number, turn: number, by: number): Side[] {
  const count = Math.ceil(Math.abs(turn) / (2 * Math.acos(by / (by + bulge))));
  const outside = by / Math.cos(turn / count / 2);
  const at = (share: number) => beside(corner, direction + turn * share, outside);
  return Array.from({ length: count }, (_, step) => ({
    from: at(step / count),
    to: at((step + 1) / count),
  }));
}

/** Cut where they cross, so that each piece is wholly far enough from every cut, or too near. */
function splitAtMeetings(pieces: readonly Side[]): Side[] {
  const order = pieces.map((piece, at) => ({ at, ...extentOf(piece) }));
  order.sort((a, b) => a.minX - b.minX);
  const shares: number[][] = pieces.map(() => [0, 1]);
  let reaching: typeof order = [];
  for (const one of order) {
    reaching = reaching.filter(({ maxX }) => maxX >= one.minX);
    for (const other of reaching) {
      if (other.maxY < one.minY || other.minY > one.maxY) continue;
      const met = meeting(pieces[one.at] as Side, pieces[other.at] as Side);
      if (!met) continue;
      shares[one.at]?.push(met[0]);
      shares[other.at]?.push(met[1]);
    }
    reaching.push(one);
  }
  return pieces.flatMap((piece, at) => parts(piece, shares[at] as number[]));
}

const extentOf = ({ from, to }: Side) => ({
  minX: Math.min(from.x, to.x),
  maxX: Math.max(from.x, to.x),
  minY: Math.min(from.y, to.y),
  maxY: Math.max(from.y, to.y),
});

/** The shares of both at which they cross, or null. */
function meeting(a: Side, b: Side): [number, number] | null {
  const [ux, uy] = [a.to.x - a.from.x, a.to.y - a.from.y];
  const [vx, vy] = [b.to.x - b.from.x, b.to.y - b.from.y];
  const [wx, wy] = [b.from.x - a.from.x, b.from.y - a.from.y];
  const across = ux * vy - uy * vx;
  if (across === 0) return null;
  const [s, t] = [(wx * vy - wy * vx) / across, (wx * uy - wy * ux) / across];
  return isShare(s) && isShare(t) ? [s, t] : null;
}

// A crossing at the very end of one still cuts the other.
const isShare = (value: number): boolean => value > -1e-9 && value < 1 + 1e-9;

function parts(piece: Side, shares: number[]): Side[] {
  const sorted = [...shares].sort((a, b) => a - b);
  return sorted
    .slice(1)
    .map((share, step) => ({ from: along(piece, sorted[step] as number), to: along(piece, share) }))
    .filter((part) => lengthOf(part) > 1e-6);
}

/** Whether the middle of a piece is far enough from every cut, and in the leather. */
const isFree = (sides: readonly Side[], passes: PassesWithin, least: number) => (piece: Side) => {
  const middle = along(piece, 0.5);
  return !passes(middle, least) && isInside(sides, middle);
};

/** In the outline and in no hole: a line to the right crosses an odd number of edges. */
function isInside(edges: readonly Side[], { x, y }: Point): boolean {
  let inside = false;
  for (const { from, to } of edges) {
    if (from.y > y === to.y > y) continue;
    if (x < from.x + ((y - from.y) / (to.y - from.y)) * (to.x - from.x)) inside = !inside;
  }
  return inside;
}

/** Pieces that follow each other become one line, and those in one straight line one stretch of it. */
function chained(pieces: readonly Side[]): Point[][] {
  const lines: Point[][] = [];
  for (const { from, to } of pieces) {
    const line = lines.at(-1);
    if (!line || !meets(line.at(-1), from)) lines.push([from, to]);
    else {
      if (goesOn(line, to)) line.pop();
      line.push(to);
    }
  }
  return lines;
}

const meets = (a: Point | undefined, b: Point): boolean =>
  a !== undefined && Math.hypot(a.x - b.x, a.y - b.y) < 0.01;

function goesOn(line: readonly Point[], to: Point): boolean {
  const [before, last] = [line.at(-2), line.at(-1)];
  if (!before || !last) return false;
  const across = (last.x - before.x) * (to.y - last.y) - (last.y - before.y) * (to.x - last.x);
  return Math.abs(across) < 1e-6;
}
