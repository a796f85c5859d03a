import { isSameHalfTurned } from '../outline/measure.ts';
import type { Outline, Point } from '../outline/outline.ts';
import { bestFit, type Cell, type Fit, type Room } from './cell.ts';
import { type Piece, pieceOf, quarterTurned } from './piece.ts';
import type { Setting } from './place.ts';
import { pairCells, rowCells } from './row-cells.ts';

export interface Found {
  piece: Piece;
  fit: Fit;
  setting: Setting;
}

export interface Area extends Room {
  trimX: number;
  trimY: number;
}

/**
 * The best regular layout of a polygon in an area: rows along it and up it, the piece lying and
 * standing. Null where not one piece fits.
 */
export function bestRows(
  outline: Outline,
  polygon: readonly Point[],
  spacing: number,
  area: Area,
): Found | null {
  let best: Found | null = null;
  for (const quarters of outline.shape === 'round' ? ([0] as const) : ([0, 1] as const)) {
    const piece = pieceOf(quarterTurned(polygon, quarters), spacing);
    const halfTurnMatters = !isSameHalfTurned(outline);
    let pairs: Cell[] | null = halfTurnMatters ? null : [];
    for (const upright of [false, true]) {
      const room = upright
        ? { width: area.height, height: area.width }
        : { width: area.width, height: area.height };
      if (!fitsAtAll(piece, room)) continue;
      pairs ??= pairCells(piece);
      const setting = { room, quarters, upright, trimX: area.trimX, trimY: area.trimY };
      const rows = rowCells(piece, room, halfTurnMatters);
      const fit = bestOf(piece, room, [rows, pairs]);
      if (fit && fit.score > (best?.fit.score ?? 0) + 1e-9) best = { piece, fit, setting };
    }
  }
  return best;
}

const fitsAtAll = (piece: Piece, room: Room): boolean =>
  room.width + 1e-6 >= piece.width && room.height + 1e-6 >= piece.height;

function bestOf(piece: Piece, room: Room, families: Iterable<Cell>[]): Fit | null {
  let best: Fit | null = null;
  for (const cells of families) {
    for (const cell of cells) {
      const fit = bestFit(piece, cell, room);
      if (fit.score > (best?.score ?? 0) + 1e-9) best = fit;
    }
  }
  return best;
}
