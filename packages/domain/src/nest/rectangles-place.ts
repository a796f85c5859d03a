import type { Ell, Part } from './rectangles-cuts.ts';
import type { WholeSizes } from './rectangles-instance.ts';
import { blockOf } from './rectangles-rows.ts';
import type { Known } from './rectangles-search.ts';

/** A piece in whole sizes: its lower left corner, and whether its short side lies along x. */
export interface WholePiece {
  x: number;
  y: number;
  turned: boolean;
}

/** From an L's own coordinates to the container's: mirrored at the diagonal first, then at the axes, then shifted. */
interface Frame {
  swapped: boolean;
  x: number;
  y: number;
  left: boolean;
  down: boolean;
}

/** What a search knows of an L, and whether that is kept for its mirror image. */
export type Look = (ell: Ell) => { known: Known; mirrored: boolean } | null;

/** Follows the cuts that were found, down to blocks of pieces that lie the same way. */
export function piecesOf(ell: Ell, sizes: WholeSizes, look: Look): WholePiece[] {
  const pieces: WholePiece[] = [];
  const waiting = [{ ell, frame: { swapped: false, x: 0, y: 0, left: false, down: false } }];
  for (let next = waiting.pop(); next; next = waiting.pop()) {
    const found = look(next.ell);
    if (!found || found.known.found === 0) continue;
    const frame = found.mirrored ? swappedFrame(next.frame) : next.frame;
    const { cut } = found.known;
    if (cut === null) pieces.push(...block(found.known.ell, sizes, frame));
    else waiting.push(...cut.map((part) => ({ ell: part.ell, frame: frameOf(frame, part) })));
  }
  return pieces;
}

function swappedFrame(frame: Frame): Frame {
  return { ...frame, swapped: !frame.swapped };
}

/** The frame of a part: (x, y) of it lie at (±x, ±y) from its corner in the L. */
function frameOf(outer: Frame, part: Part): Frame {
  const corner = placed(outer, part.x, part.y);
  const [left, down] = outer.swapped ? [part.down, part.left] : [part.left, part.down];
  return {
    swapped: outer.swapped,
    x: corner.x,
    y: corner.y,
    left: outer.left !== left,
    down: outer.down !== down,
  };
}

function placed({ swapped, x, y, left, down }: Frame, atX: number, atY: number) {
  const [along, up] = swapped ? [atY, atX] : [atX, atY];
  return { x: left ? x - along : x + along, y: down ? y - up : y + up };
}

function block(ell: Ell, sizes: WholeSizes, frame: Frame): WholePiece[] {
  const { columns, rows, turned } = blockOf(ell, sizes);
  const [wide, high] = turned ? [sizes.short, sizes.long] : [sizes.long, sizes.short];
  return Array.from({ length: columns * rows }, (_, at) => {
    const [x, y] = [(at % columns) * wide, Math.floor(at / columns) * high];
    const [one, other] = [placed(frame, x, y), placed(frame, x + wide, y + high)];
    return {
      x: Math.min(one.x, other.x),
      y: Math.min(one.y, other.y),
      turned: turned !== frame.swapped,
    };
  });
}
