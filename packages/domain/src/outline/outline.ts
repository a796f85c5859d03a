/**
 * The closed curve that a cutting die cuts, by its measures in mm. Every outline lies with the
 * middle of its bounding box at the origin.
 */
export type Outline = Round | Rectangle | Oval | Tag | DrawnPolygon;

export interface Round {
  shape: 'round';
  diameterMm: number;
}

/** width along x, height along y */
export interface Rectangle {
  shape: 'rectangle';
  widthMm: number;
  heightMm: number;
  cornerRadiusMm: number;
}

/** an ellipse: width along x, height along y */
export interface Oval {
  shape: 'oval';
  widthMm: number;
  heightMm: number;
}

/**
 * A body with a narrower neck at one end. Its length runs along x, the neck towards positive x;
 * the neck's length is part of the whole length. Between them lies a shoulder of 45° where there
 * is room for it.
 */
export interface Tag {
  shape: 'tag';
  lengthMm: number;
  widthMm: number;
  neckLengthMm: number;
  neckWidthMm: number;
  cornerRadiusMm: number;
}

/**
 * A shape of its own: 3 to 3,000 corners in mm, either way round, without the first repeated at the
 * end. They may lie anywhere and are rounded to 1 µm; the shape is moved to the origin by whole
 * micrometres. `punched` are closed curves inside it, holes and slots that the die cuts as well:
 * drawn and counted in the cutting edge, of no account to how pieces lie.
 */
export interface DrawnPolygon {
  shape: 'polygon';
  points: readonly Point[];
  punched?: readonly (readonly Point[])[] | undefined;
}

export interface Point {
  x: number;
  y: number;
}

export interface Bounds {
  minX: number;
  minY: number;
  maxX: number;
  maxY: number;
}
