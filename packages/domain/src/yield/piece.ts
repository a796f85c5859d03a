import type { Bounds, Point } from '../outline/outline.ts';
import { type Faces, facesOf, restingHeight } from './contact.ts';

/** 0: as it is; 1: half a turn from that. */
export type HalfTurns = 0 | 1;

/** A piece in one orientation and its half-turned twin, prepared for one spacing. */
export interface Piece {
  width: number;
  height: number;
  /** lower left corner of the bounding box, for each of the two */
  corner: readonly [Point, Point];
  spacing: number;
  /** least height of one over the other at a sideways shift */
  over: (below: HalfTurns, above: HalfTurns, shift: number) => number;
  /** least distance of one to the right of the other at a shift upwards */
  beside: (left: HalfTurns, right: HalfTurns, shift: number) => number;
}

/** Turns a polygon by quarters of a full turn, counter-clockwise about the origin. */
export function quarterTurned(polygon: readonly Point[], quarters: number): Point[] {
  return polygon.map(({ x, y }) => {
    if (quarters % 4 === 1) return { x: -y, y: x };
    if (quarters % 4 === 2) return { x: -x, y: -y };
    return quarters % 4 === 3 ? { x: y, y: -x } : { x, y };
  });
}

function boundsOf(polygon: readonly Point[]): Bounds {
  const [xs, ys] = [polygon.map(({ x }) => x), polygon.map(({ y }) => y)];
  return {
    minX: Math.min(...xs),
    minY: Math.min(...ys),
    maxX: Math.max(...xs),
    maxY: Math.max(...ys),
  };
}

export function pieceOf(polygon: readonly Point[], spacing: number): Piece {
  const facesAt = (quarters: number): Faces => facesOf(quarterTurned(polygon, quarters), spacing);
  const upright = [facesAt(0), facesAt(2)] as const;
  // A quarter turn makes right into up, and up into left.
  const lying = [facesAt(1), facesAt(3)] as const;
  const { minX, minY, maxX, maxY } = boundsOf(polygon);
  return {
    width: maxX - minX,
    height: maxY - minY,
    corner: [
      { x: minX, y: minY },
      { x: -maxX, y: -maxY },
    ],
    spacing,
    over: (below, above, shift) => restingHeight(upright[below], upright[above], shift),
    beside: (left, right, shift) => restingHeight(lying[left], lying[right], -shift),
  };
}
