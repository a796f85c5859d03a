import type { Point } from '../outline/outline.ts';

/** A closed polygon without its first point repeated. Counter-clockwise outside, clockwise holes. */
export type Ring = readonly Point[];

/** Degrees counter-clockwise that a piece may be turned by, or any angle at all. */
export type Rotations = readonly number[] | 'free';

/** What is cut from, in mm: [0, w] × [0, h]; a strip along x from 0 with y in [0, width]; a side. */
export type NestContainer =
  | { type: 'rect'; w: number; h: number }
  | { type: 'strip'; width: number; qty?: number }
  | { type: 'polygon'; points: readonly Point[] };

/** How many copies of one outline lie in a container; every length in mm. */
export interface NestProblem {
  /** a simple polygon, either way round, its origin anywhere */
  outline: readonly Point[];
  container: NestContainer;
  /** flaws: nothing is cut over them */
  holes?: readonly (readonly Point[])[];
  /** least distance between two pieces, 0 to 100 mm */
  gap: number;
  rotations: Rotations;
  /** kept clear along the container's edges, 0 to 100 mm */
  trim?: number;
  /** kept clear around every flaw, 0 to 100 mm */
  flawClearance?: number;
}

/** Turn the outline `rot` degrees counter-clockwise about the origin, then shift it by (x, y). */
export interface NestPlacement {
  x: number;
  y: number;
  rot: number;
}

/** A whole number of pieces that comes again after so many mm of strip. */
export interface StripPeriod {
  mm: number;
  pieces: number;
}

/** How the rows lie, in the numbers that go on the ticket. */
export interface RowNumbers {
  /** from one piece of a row to the next */
  pitchMm: number;
  /** from one row to the next, square to the rows (on average over a repeat) */
  rowStepMm: number;
  /** by how much a row is shifted along itself against the row before */
  shiftMm: number;
  /** the rows' direction in degrees counter-clockwise from x */
  directionDeg: number;
  /** the turn of each row's pieces, within one repeat */
  rowTurns: readonly number[];
}

export interface RegularPlan {
  placements: NestPlacement[];
  /** null where nothing fits */
  rows: RowNumbers | null;
  /** share of the plane that the densest pattern found for this outline covers; 0 if none was sought */
  planeDensity: number;
  /** area that each piece takes of the repeating pattern, in mm²; null where rows differ */
  cellAreaMm2: number | null;
  /** strip only */
  period: StripPeriod | null;
  /** strip only: length of strip per piece in the middle of a long strip */
  mmPerPiece: number | null;
}
