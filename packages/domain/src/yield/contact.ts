import type { Point } from '../outline/outline.ts';

interface Edge {
  fromX: number;
  toX: number;
  slope: number;
  atZero: number;
}

/** What can hold something up within a narrow band of x. */
interface Band {
  edges: Edge[];
  corners: Point[];
}

/**
 * The side of a polygon that faces up, prepared for one spacing: the edges moved out by it, and its
 * corners, around which the spacing is a disc; both sorted into bands of equal width.
 */
interface Face {
  corners: Point[];
  spacing: number;
  fromX: number;
  toX: number;
  bands: Band[];
}

/** A polygon's upper and lower face; the lower one is kept upside down, so that both face up. */
export interface Faces {
  upper: Face;
  lower: Face;
}

/** Two pieces that only graze each other sideways do not hold each other up. */
const graze = 1e-7;
const bandCount = 96;

/** Prepares a polygon (counter-clockwise) for `restingHeight` at a spacing. */
export function facesOf(polygon: readonly Point[], spacing: number): Faces {
  const flipped = polygon.map(({ x, y }) => ({ x, y: -y })).reverse();
  return { upper: upperFace(polygon, spacing), lower: upperFace(flipped, spacing) };
}

function upperFace(polygon: readonly Point[], spacing: number): Face {
  const xs = polygon.map(({ x }) => x);
  const [fromX, toX] = [Math.min(...xs) - spacing, Math.max(...xs) + spacing];
  const bands = Array.from({ length: bandCount }, (): Band => ({ edges: [], corners: [] }));
  const face: Face = { corners: [], spacing, fromX, toX, bands };
  const corners = new Set<Point>();
  polygon.forEach((from, at) => {
    const to = polygon[(at + 1) % polygon.length] as Point;
    // Counter-clockwise, so what runs to the left has its outside above it.
    if (to.x > from.x) return;
    corners.add(from).add(to);
    if (to.x < from.x) addEdge(face, movedOut(from, to, spacing));
  });
  face.corners = [...corners];
  for (const corner of face.corners) addCorner(face, corner);
  return face;
}

function movedOut(from: Point, to: Point, spacing: number): Edge {
  const length = Math.hypot(to.x - from.x, to.y - from.y);
  const outX = ((to.y - from.y) / length) * spacing;
  const outY = ((from.x - to.x) / length) * spacing;
  const slope = (to.y - from.y) / (to.x - from.x);
  const atZero = from.y + outY - slope * (from.x + outX);
  return { fromX: to.x + outX - graze, toX: from.x + outX + graze, slope, atZero };
}

function addEdge(face: Face, edge: Edge): void {
  for (let at = bandAt(face, edge.fromX); at <= bandAt(face, edge.toX); at += 1) {
    face.bands[at]?.edges.push(edge);
  }
}

function addCorner(face: Face, corner: Point): void {
  if (face.spacing === 0) return;
  const to = bandAt(face, corner.x + face.spacing);
  for (let at = bandAt(face, corner.x - face.spacing); at <= to; at += 1) {
    face.bands[at]?.corners.push(corner);
  }
}

function bandAt({ fromX, toX }: Face, x: number): number {
  const at = Math.floor(((x - fromX) / (toX - fromX)) * bandCount);
  return Math.min(bandCount - 1, Math.max(0, at));
}

/**
 * The least height of `above` over `below`, when it is shifted sideways by `shift`, from which on
 * the two keep the spacing; -Infinity where they cannot meet. Exact for polygons: where two
 * polygons rest on each other, a corner of one rests on an edge or a corner of the other.
 */
export function restingHeight(below: Faces, above: Faces, shift: number): number {
  const { upper } = below;
  const { lower } = above;
  // Both faces are widened by the spacing, which counts only once between them.
  const from = Math.max(upper.fromX, lower.fromX + lower.spacing + shift);
  const to = Math.min(upper.toX, lower.toX - lower.spacing + shift);
  if (to - from <= 2 * graze) return -Infinity;
  return Math.max(highest(upper, lower.corners, shift), highest(lower, upper.corners, -shift));
}

function highest(face: Face, corners: readonly Point[], shift: number): number {
  let height = -Infinity;
  for (const corner of corners) {
    const x = corner.x + shift;
    if (x < face.fromX - graze || x > face.toX + graze) continue;
    const top = topAt(face, x);
    if (top + corner.y > height) height = top + corner.y;
  }
  return height;
}

/** How high the face, grown by the spacing, reaches at x. */
function topAt(face: Face, x: number): number {
  const band = face.bands[bandAt(face, x)] as Band;
  let top = -Infinity;
  for (const edge of band.edges) {
    if (x < edge.fromX || x > edge.toX) continue;
    const y = edge.slope * x + edge.atZero;
    if (y > top) top = y;
  }
  const reach = face.spacing * face.spacing;
  for (const corner of band.corners) {
    const left = reach - (x - corner.x) * (x - corner.x);
    if (left < 0) continue;
    const y = corner.y + Math.sqrt(left);
    if (y > top) top = y;
  }
  return top;
}
