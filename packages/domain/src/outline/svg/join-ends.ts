import type { Point } from '../outline.ts';
import type { Polyline } from './flatten.ts';

/** A line with its number in the drawing, which it keeps when others are joined to it. */
export interface NumberedLine extends Polyline {
  id: number;
}

interface End {
  line: NumberedLine;
  atStart: boolean;
  place: Point;
}

/**
 * Joins open lines whose ends meet within `reach`, as programs for technical drawing save an outline
 * in pieces, and closes those that come back to their own beginning. Where more than two ends meet,
 * nothing says which belong together, and they stay open.
 */
export function joinEnds(lines: readonly NumberedLine[], reach: number): NumberedLine[] {
  const closed = lines.filter((line) => line.closed);
  const open = lines.filter((line) => !line.closed).map((line) => closedIfMeeting(line, reach));
  const loose = open.filter((line) => !line.closed);
  const partner = partners(loose, reach);
  const used = new Set<NumberedLine>();
  const chains: NumberedLine[] = [];
  // Chains with a free end begin there; what is left afterwards goes round.
  const beginnings = loose.filter((line) => !partner(line, true) || !partner(line, false));
  for (const line of [...beginnings, ...loose]) {
    if (used.has(line)) continue;
    chains.push(closedIfMeeting(chainFrom(line, partner, used), reach));
  }
  return [...closed, ...open.filter((line) => line.closed), ...chains].sort((a, b) => a.id - b.id);
}

type Partner = (line: NumberedLine, atStart: boolean) => End | undefined;

function chainFrom(first: NumberedLine, partner: Partner, used: Set<NumberedLine>): NumberedLine {
  let id = first.id;
  const points: Point[] = [];
  let entry: { line: NumberedLine; atStart: boolean } | undefined = {
    line: first,
    atStart: !partner(first, true) || Boolean(partner(first, false)),
  };
  while (entry && !used.has(entry.line)) {
    const { line, atStart }: { line: NumberedLine; atStart: boolean } = entry;
    used.add(line);
    id = Math.min(id, line.id);
    const along = atStart ? line.points : [...line.points].reverse();
    for (const point of points.length === 0 ? along : along.slice(1)) points.push(point);
    entry = partner(line, !atStart);
  }
  return { id, points, closed: false };
}

function closedIfMeeting(line: NumberedLine, reach: number): NumberedLine {
  const [first, last] = [line.points[0], line.points.at(-1)];
  if (line.points.length < 4 || !first || !last || apart(first, last) > reach) return line;
  return { ...line, points: line.points.slice(0, -1), closed: true };
}

/** For each end the only other one within reach, found by squares twice as wide as that. */
function partners(lines: readonly NumberedLine[], reach: number): Partner {
  const ends = lines.flatMap((line): [End, End] => [
    { line, atStart: true, place: line.points[0] as Point },
    { line, atStart: false, place: line.points.at(-1) as Point },
  ]);
  const near = nearest(ends, reach);
  const [starts, tails] = [new Map<NumberedLine, End>(), new Map<NumberedLine, End>()];
  for (const end of ends) {
    const [only, another] = near.get(end) ?? [];
    if (!only || another || only.line === end.line || near.get(only)?.length !== 1) continue;
    (end.atStart ? starts : tails).set(end.line, only);
  }
  return (line, atStart) => (atStart ? starts : tails).get(line);
}

function nearest(ends: readonly End[], reach: number): Map<End, End[]> {
  const size = 2 * reach;
  const squares = new Map<string, End[]>();
  for (const end of ends) {
    const key = `${Math.floor(end.place.x / size)} ${Math.floor(end.place.y / size)}`;
    const square = squares.get(key);
    if (square) square.push(end);
    else squares.set(key, [end]);
  }
  const near = (end: End): End[] =>
    around(end, squares, size).filter(
      (other) => other !== end && apart(other.place, end.place) <= reach,
    );
  return new Map(ends.map((end) => [end, near(end)]));
}

/** More than a handful in one place are a knot, which nothing is to be joined in. */
const handful = 8;

function around({ place }: End, squares: ReadonlyMap<string, End[]>, size: number): End[] {
  const [column, row] = [Math.floor(place.x / size), Math.floor(place.y / size)];
  const near: End[] = [];
  for (let x = column - 1; x <= column + 1; x += 1) {
    for (let y = row - 1; y <= row + 1; y += 1) {
      near.push(...(squares.get(`${x} ${y}`) ?? []).slice(0, handful));
    }
  }
  return near;
}

const apart = (a: Point, b: Point): number => Math.hypot(a.x - b.x, a.y - b.y);
