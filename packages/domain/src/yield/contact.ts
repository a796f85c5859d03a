import type { Point } from '../outline/outline.ts';

/**
 * The side of a polygon that faces up, prepared for one spacing: the edges moved out by it, and its
 * corners, around which the spacing is a disc.
 */
interface Face {
  corners: Point[];
  edges: { fromX: number; toX: number; slope: number; atZero: number }[];
  spacing: number;
}

/** A polygon's upper and lower face; the lower one is kept upside down, so that both face up. */
export interface Faces {
  upper: Face;
  lower: Face;
}

/** Two pieces that only graze each other do not hold each other up. */
const graze = 1e-7;

/** Prepares a polygon (counter-clockwise) for `restingHeight` at a spacing. */
export function facesOf(polygon: readonly Point[], spacing: number): Faces {
  const flipped = polygon.map(({ x, y }) => ({ x, y: -y })).reverse();
  return { upper: upperFace(polygon, spacing), lower: upperFace(flipped, spacing) };
}

function upperFace(polygon: readonly Point[], spacing: number): Face {
  const face: Face = { corners: [], edges: [], spacing };
  polygon.forEach((from, at) => {
    const to = polygon[(at + 1) % polygon.length] as Point;
    // Counter-clockwise, so what runs to the left has its outside above it.
    if (to.x > from.x) return;
    face.corners.push(from, to);
    if (to.x < from.x) face.edges.push(movedOut(from, to, spacing));
  });
  face.corners = [...new Set(face.corners)];
  return face;
}

function movedOut(from: Point, to: Point, spacing: number): Face['edges'][number] {
  const length = Math.hypot(to.x - from.x, to.y - from.y);
  const outX = ((to.y - from.y) / length) * spacing;
  const outY = ((from.x - to.x) / length) * spacing;
  const slope = (to.y - from.y) / (to.x - from.x);
  const atZero = from.y + outY - slope * (from.x + outX);
  return { fromX: to.x + outX, toX: from.x + outX, slope, atZero };
}

/**
 * The least height of `above` over `below`, when it is shifted sideways by `shift`, from which on
 * the two keep the spacing; -Infinity where they cannot meet. Exact for polygons: where two
 * polygons rest on each other, a corner of one rests on an edge or a corner of the other.
 */
export function restingHeight(below: Faces, above: Faces, shift: number): number {
  return Math.max(
    highest(below.upper, above.lower.corners, shift),
    highest(above.lower, below.upper.corners, -shift),
  );
}

function highest(face: Face, corners: readonly Point[], shift: number): number {
  let height = -Infinity;
  for (const corner of corners) {
    const x = corner.x + shift;
    for (const edge of face.edges) {
      if (x <= edge.fromX + graze || x >= edge.toX - graze) continue;
      height = Math.max(height, edge.slope * x + edge.atZero + corner.y);
    }
    if (face.spacing > 0) height = Math.max(height, overDiscs(face, x) + corner.y);
  }
  return height;
}

function overDiscs({ corners, spacing }: Face, x: number): number {
  let height = -Infinity;
  for (const corner of corners) {
    const away = Math.abs(x - corner.x);
    if (away >= spacing - graze) continue;
    height = Math.max(height, corner.y + Math.sqrt(spacing * spacing - away * away));
  }
  return height;
}
