import type { DecimalText } from '../numbers/decimal-text.ts';
import type { DrawnSide } from '../leather/drawn-side.ts';
import type { Outline } from '../outline/outline.ts';
import type { Offcut } from './offcut.ts';

/** What is cut from, in mm: a panel, or a strip, which has no end unless a length is given. */
export type Container =
  | { form: 'panel'; widthMm: number; heightMm: number }
  | { form: 'strip'; widthMm: number; lengthMm?: number };

/** How a piece may be turned against the spine, which runs along x. */
export type Turns = 'with the spine' | 'quarter turns' | 'free';

/** Rows that a person repeats by hand, or the most pieces found anyhow. */
export type Search = 'rows' | 'best';

/** How pieces may lie, whatever they are cut from. */
export interface LayRules {
  outline: Outline;
  /** least distance between two cuts, 0 to 100 mm */
  spacingMm: number;
  /** unusable border along every edge and around every flaw, in mm; an endless strip has no ends */
  trimMm: number;
  /** quarter turns where not said */
  turns?: Turns;
  /** rows where not said; an endless strip is always laid in rows */
  search?: Search;
}

export interface LayoutInput extends LayRules {
  container: Container;
}

export interface SideInput extends LayRules {
  side: DrawnSide;
  /** cut it into strips no wider than this first, in mm, each laid in rows; left whole where not said */
  widestMm?: number;
}

/** Turn the outline's polygon `rot` degrees counter-clockwise about the origin, then shift it. */
export interface Placement {
  x: number;
  y: number;
  rot: number;
}

export type Turned = 'none' | 'every other row' | 'every other piece';

/**
 * How copies of an outline lie, in cutting order. A panel is [0, width] × [0, height]; a strip lies
 * along x with y from 0 to its width. For a strip without a length, `pieces`, `placements` and the
 * areas are those of one period, after which the arrangement repeats. What a hand count does not
 * know is null.
 */
export interface Layout extends Lie {
  container: Container;
  /** strip only: length of strip that each piece takes, in the middle of a long strip */
  mmPerPiece: number | null;
  /** strip only: the arrangement repeats after so many mm, with so many pieces */
  period: { mm: number; pieces: number } | null;
}

/** A layout on a side, which lies as it was drawn. */
export interface SideLayout extends Lie {
  side: DrawnSide;
  /** null where it is left whole */
  cuts: SideCuts | null;
}

/** Straight cuts, all one way, that part a side into strips before its pieces are cut. */
export interface SideCuts {
  /** the way that the cuts run: along x (width) or along y (height) */
  along: 'width' | 'height';
  /** where they cross the other axis, in the side's own mm, rising */
  at: number[];
  /** in the order of the cuts, one more than there are cuts */
  strips: SideStrip[];
}

export interface SideStrip {
  widthMm: number;
  /** from end to end, edge and flaws and all */
  lengthMm: number;
  pieces: number;
}

/** How pieces lie, in cutting order, and where the leather goes. */
export interface Lie {
  by: 'rows' | 'best found' | 'hand count';
  pieces: number;
  placements: Placement[];
  /** from one piece of a row to the next */
  pitchMm: number | null;
  /** from one row to the next (on average, where the steps differ) */
  rowStepMm: number | null;
  /** by how much a row is shifted along itself against the one before */
  shiftMm: number | null;
  rows: number | null;
  /** of the longest row */
  piecesPerRow: number | null;
  /** of each row, in cutting order; rows at a flaw or of round pieces differ in length */
  rowPieces: number[] | null;
  turned: Turned;
  containerAreaMm2: DecimalText;
  pieceAreaMm2: DecimalText | null;
  /** area of the pieces as a per cent of the container's */
  yieldPercent: DecimalText | null;
  /** area of leather that each piece takes, waste included; null where nothing fits */
  areaPerPieceMm2: DecimalText | null;
  /** waste between pieces: the pattern's cell less the piece, as a per cent of the cell */
  wasteBetweenPercent: DecimalText | null;
  /** waste along the edges and flaws: what no cell covers, as a per cent of the container */
  edgeWastePercent: DecimalText | null;
  /** the largest upright rectangle left over, where it is worth keeping; null where none is */
  offcut: Offcut | null;
  /** no layout of any kind gives more than this */
  boundPieces: number | null;
  /** what rows would give, where more was found another way */
  piecesInRows: number | null;
}
