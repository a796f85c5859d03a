import type { DecimalText } from '../numbers/decimal-text.ts';
import type { Outline } from '../outline/outline.ts';

/** What is cut from: a panel, or a strip, which has no end unless a length is given. In mm. */
export type Container =
  | { form: 'panel'; widthMm: number; heightMm: number }
  | { form: 'strip'; widthMm: number; lengthMm?: number };

export interface LayoutInput {
  outline: Outline;
  /** least distance between two cuts, 0 to 100 mm */
  spacingMm: number;
  /** unusable border on every side of a panel, on both sides (and ends) of a strip, in mm */
  trimMm: number;
  container: Container;
}

/** Turn the outline's polygon `rot` degrees counter-clockwise about the origin, then shift it. */
export interface Placement {
  x: number;
  y: number;
  rot: number;
}

export type Turned = 'none' | 'every other row' | 'every other piece';

/**
 * How copies of an outline lie. A panel is [0, width] × [0, height]; a strip lies along x with y
 * from 0 to its width. For a strip without a length, `pieces`, `placements` and the areas are those
 * of one period, after which the arrangement repeats. What a hand count does not know is null.
 */
export interface Layout {
  by: 'rows' | 'hand count';
  pieces: number;
  placements: Placement[];
  /** from one piece of a row to the next (on average, where every other piece is turned) */
  pitchMm: number | null;
  /** from one row to the next (on average, where the steps differ) */
  rowStepMm: number | null;
  /** by how much every other row is shifted along itself */
  shiftMm: number | null;
  rows: number | null;
  piecesPerRow: number | null;
  turned: Turned;
  container: Container;
  containerAreaMm2: DecimalText;
  pieceAreaMm2: DecimalText | null;
  /** area of the pieces as a per cent of the container's */
  yieldPercent: DecimalText | null;
  /** area of leather that each piece takes, waste included; null where nothing fits */
  areaPerPieceMm2: DecimalText | null;
  /** no layout of any kind gives more than this */
  boundPieces: number | null;
  /** strip only: length of strip that each piece takes, in the middle of a long strip */
  mmPerPiece: number | null;
  /** strip only: the arrangement repeats after so many mm, with so many pieces */
  period: { mm: number; pieces: number } | null;
}
