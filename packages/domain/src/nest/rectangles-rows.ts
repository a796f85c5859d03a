import { box, type Cut, type Ell, part } from './rectangles-cuts.ts';
import type { WholeSizes } from './rectangles-instance.ts';

type Piece = Pick<WholeSizes, 'long' | 'short'>;

/** Pieces that all lie the same way in a rectangle: how many along and up. */
export function blockOf({ width, height }: Ell, { long, short }: Piece) {
  const lying = { columns: Math.floor(width / long), rows: Math.floor(height / short) };
  const standing = { columns: Math.floor(width / short), rows: Math.floor(height / long) };
  return lying.columns * lying.rows >= standing.columns * standing.rows
    ? { ...lying, turned: false }
    : { ...standing, turned: true };
}

export function blockCount(ell: Ell, piece: Piece): number {
  const { columns, rows } = blockOf(ell, piece);
  return columns * rows;
}

/** One row off the left or the lower side, as deep as the piece is long or wide. */
export function rowCuts({ width, height }: Ell, { long, short }: Piece): Cut[] {
  return [long, short].flatMap((depth) => [
    ...(depth < width
      ? [[part(box(depth, height), 0, 0), part(box(width - depth, height), depth, 0)] as const]
      : []),
    ...(depth < height
      ? [[part(box(width, depth), 0, 0), part(box(width, height - depth), 0, depth)] as const]
      : []),
  ]);
}
