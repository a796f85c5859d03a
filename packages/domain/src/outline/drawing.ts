import type { Bounds, Point } from './outline.ts';

/** A closed curve found in a drawing, in the drawing's units. */
export interface ClosedCurve {
  /** which line of the drawing it is; stays the same however the drawing is scaled */
  id: number;
  points: Point[];
  bounds: Bounds;
  width: number;
  height: number;
  area: number;
  /** its length, all the way round */
  edge: number;
  /** the id of the smallest curve that it lies in */
  within: number | null;
}

/** A line whose ends do not meet. */
export interface OpenCurve {
  id: number;
  points: Point[];
  length: number;
  from: Point;
  to: Point;
}

/** What was found in a drawing. Where it says no unit, sizes are in its own units. */
export interface Drawing {
  unit: 'mm' | 'drawing units';
  /** whether one width must be told before it has a size */
  needsWidth: boolean;
  /** by how much the corners' straight lines leave the curves at most, in `unit` */
  tolerance: number;
  /** closed curves, the largest first */
  closed: ClosedCurve[];
  open: OpenCurve[];
  /** the id of the one that looks like the die's: the largest */
  likely: number | null;
  /** what was not read, in sentences for the person who chose the file */
  leftOut: string[];
}

export interface DrawingOptions {
  /** how closely curves are followed, 0.001 to 1 mm; 0.01 by default */
  toleranceMm?: number | undefined;
  /** the width of one closed curve (the largest, unless named), from which a size is given to all */
  known?: { widthMm: number; curve?: number | undefined } | undefined;
}
