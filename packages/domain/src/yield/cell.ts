import type { HalfTurns, Piece } from './piece.ts';
import type { Turned } from './layout.ts';

export interface Member {
  turn: HalfTurns;
  x: number;
  y: number;
  /** which of the cell's rows it belongs to */
  row: number;
}

/** Rows that repeat: the members come again every `periodX` to the right and every `periodY` up. */
export interface Cell {
  members: Member[];
  periodX: number;
  periodY: number;
  rowsInCell: number;
  turned: Turned;
  shift: number;
}

/** The usable room, lower left corner at the origin; one side may be Infinity. */
export interface Room {
  width: number;
  height: number;
}

export interface Fit {
  cell: Cell;
  /** where the cell's own origin lies in the room */
  x: number;
  y: number;
  /** pieces, or for a room without end pieces per mm of its length */
  score: number;
}

/** The positions k for which start + k × period lies within 0 … free. */
export function positions(
  start: number,
  period: number,
  free: number,
): { first: number; count: number } {
  const tiny = 1e-6 / period;
  const first = Math.ceil(-start / period - tiny);
  const last = Math.floor((free - start) / period + tiny);
  return { first, count: Math.max(0, last - first + 1) };
}

/**
 * The best way to put a cell into a room without turning it. Whatever fits can be pushed left and
 * down until some member touches the border, so only those ways are tried.
 */
export function bestFit(piece: Piece, cell: Cell, room: Room): Fit {
  const best: Fit = { cell, x: 0, y: 0, score: 0 };
  const startsX = distinct(cell.members.map((each) => -each.x - piece.corner[each.turn].x));
  const startsY = distinct(cell.members.map((each) => -each.y - piece.corner[each.turn].y));
  for (const y of startsY) {
    for (const x of startsX) {
      const score = scoreAt(piece, cell, room, x, y);
      if (score > best.score) Object.assign(best, { x, y, score });
    }
  }
  return best;
}

const distinct = (values: number[]): number[] => [...new Set(values)];

function scoreAt(piece: Piece, cell: Cell, room: Room, x: number, y: number): number {
  let sum = 0;
  for (const member of cell.members) {
    const corner = piece.corner[member.turn];
    const across = countAlong(member.x + x + corner.x, cell.periodX, room.width - piece.width);
    const up = countAlong(member.y + y + corner.y, cell.periodY, room.height - piece.height);
    sum += across * up;
  }
  return sum;
}

/** Pieces along one direction; in a room without end, pieces per mm. */
const countAlong = (start: number, period: number, free: number): number =>
  free === Infinity ? 1 / period : positions(start, period, free).count;
