import type { Placement } from './layout.ts';
import { type Fit, positions, type Room } from './cell.ts';
import type { Piece } from './piece.ts';

/** How the room in which a fit was found lies in the container. */
export interface Setting {
  room: Room;
  /** quarter turns that the piece has in the room */
  quarters: 0 | 1;
  /** whether the rows run up the container, not along it: the room is then turned clockwise */
  upright: boolean;
  trimX: number;
  trimY: number;
}

export interface Placed {
  placements: Placement[];
  rows: number;
  piecesPerRow: number;
}

/** Every piece of a fit as placements in the container; one period where the room has no end. */
export function place(piece: Piece, fit: Fit, setting: Setting): Placed {
  const perRow = new Map<number, number>();
  const placements: Placement[] = [];
  for (const { member, column, line } of eachPiece(piece, fit, setting.room)) {
    const row = line * fit.cell.rowsInCell + member.row;
    perRow.set(row, (perRow.get(row) ?? 0) + 1);
    const x = fit.x + member.x + column * fit.cell.periodX;
    const y = fit.y + member.y + line * fit.cell.periodY;
    placements.push(inContainer(x, y, member.turn, setting));
  }
  return { placements, rows: perRow.size, piecesPerRow: Math.max(0, ...perRow.values()) };
}

function* eachPiece(piece: Piece, { cell, x, y }: Fit, room: Room) {
  for (const member of cell.members) {
    const corner = piece.corner[member.turn];
    const lines = run(y + member.y + corner.y, cell.periodY, room.height - piece.height);
    const columns = run(x + member.x + corner.x, cell.periodX, room.width - piece.width);
    for (const line of lines) for (const column of columns) yield { member, line, column };
  }
}

/** In a room without end the one position whose piece begins within the first period. */
function run(start: number, period: number, free: number): number[] {
  if (free === Infinity) return [positions(start, period, 0).first];
  const { first, count } = positions(start, period, free);
  return Array.from({ length: count }, (_, at) => first + at);
}

function inContainer(x: number, y: number, turn: number, setting: Setting): Placement {
  const rot = setting.quarters * 90 + turn * 180;
  const { trimX, trimY } = setting;
  if (!setting.upright) return { x: tidy(x + trimX), y: tidy(y + trimY), rot };
  return {
    x: tidy(y + trimX),
    y: tidy(setting.room.width - x + trimY),
    rot: (rot + 270) % 360,
  };
}

/** A tenth of a micrometre: far below what is checked, and short in JSON. */
const tidy = (value: number): number => Math.round(value * 1e4) / 1e4 + 0;
