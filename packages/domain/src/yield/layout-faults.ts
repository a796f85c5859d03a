import { outlinePolygon } from '../outline/polygon.ts';
import type { Point } from '../outline/outline.ts';
import type { Layout, LayoutInput, Placement } from './layout.ts';

/**
 * For the tests: looks at a layout with other means than it was made with (turning by sine and
 * cosine, distances from segment to segment) and says what is wrong with it.
 */
export function layoutFaults(input: LayoutInput, layout: Layout): string[] {
  const polygon = outlinePolygon(input.outline);
  const pieces = layout.placements.map((placement) => placed(polygon, placement));
  const outside = pieces.flatMap((piece, at) =>
    isInside(piece, input) ? [] : [`piece ${at} leaves the container`],
  );
  return [...outside, ...tooClose(pieces, input.spacingMm)];
}

const tolerance = 1e-3;

function placed(polygon: readonly Point[], { x, y, rot }: Placement): Point[] {
  const [cos, sin] = [Math.cos((rot * Math.PI) / 180), Math.sin((rot * Math.PI) / 180)];
  return polygon.map((point) => ({
    x: point.x * cos - point.y * sin + x,
    y: point.x * sin + point.y * cos + y,
  }));
}

function isInside(piece: readonly Point[], { container, trimMm }: LayoutInput): boolean {
  const panel = container.form === 'panel';
  const height = panel ? container.heightMm : container.widthMm;
  const length = panel ? container.widthMm : (container.lengthMm ?? Infinity);
  const trimX = length === Infinity ? 0 : trimMm;
  return piece.every(
    ({ x, y }) =>
      x >= trimX - tolerance &&
      x <= length - trimX + tolerance &&
      y >= trimMm - tolerance &&
      y <= height - trimMm + tolerance,
  );
}

function tooClose(pieces: Point[][], spacing: number): string[] {
  const boxes = pieces.map(box);
  const faults: string[] = [];
  pieces.forEach((piece, a) => {
    for (let b = a + 1; b < pieces.length; b += 1) {
      const other = pieces[b] as Point[];
      if (boxGap(boxes[a] as Box, boxes[b] as Box) > spacing) continue;
      const gap = distance(piece, other);
      if (gap < spacing - tolerance) faults.push(`pieces ${a} and ${b} are ${gap} mm apart`);
    }
  });
  return faults;
}

type Box = [minX: number, minY: number, maxX: number, maxY: number];

function box(piece: readonly Point[]): Box {
  const [xs, ys] = [piece.map(({ x }) => x), piece.map(({ y }) => y)];
  return [Math.min(...xs), Math.min(...ys), Math.max(...xs), Math.max(...ys)];
}

const boxGap = (a: Box, b: Box): number =>
  Math.hypot(Math.max(0, a[0] - b[2], b[0] - a[2]), Math.max(0, a[1] - b[3], b[1] - a[3]));

/** Distance of two polygons; below zero, by the depth of the deepest corner, where they overlap. */
function distance(a: readonly Point[], b: readonly Point[]): number {
  const depth = Math.max(deepest(a, b), deepest(b, a));
  if (depth > 0) return -depth;
  return Math.min(cornersToEdges(a, b), cornersToEdges(b, a), crossing(a, b) ? -1 : Infinity);
}

function deepest(corners: readonly Point[], polygon: readonly Point[]): number {
  const inside = corners.filter((corner) => contains(polygon, corner));
  return Math.max(0, ...inside.map((corner) => toEdges(corner, polygon)));
}

const cornersToEdges = (corners: readonly Point[], polygon: readonly Point[]): number =>
  Math.min(...corners.map((corner) => toEdges(corner, polygon)));

function toEdges(point: Point, polygon: readonly Point[]): number {
  let least = Infinity;
  polygon.forEach((from, at) => {
    const to = polygon[(at + 1) % polygon.length] as Point;
    const [dx, dy] = [to.x - from.x, to.y - from.y];
    const along = ((point.x - from.x) * dx + (point.y - from.y) * dy) / (dx * dx + dy * dy);
    const share = Math.min(1, Math.max(0, along));
    least = Math.min(
      least,
      Math.hypot(point.x - from.x - share * dx, point.y - from.y - share * dy),
    );
  });
  return least;
}

function contains(polygon: readonly Point[], { x, y }: Point): boolean {
  let inside = false;
  polygon.forEach((from, at) => {
    const to = polygon[(at + 1) % polygon.length] as Point;
    if (from.y > y === to.y > y) return;
    if (x < from.x + ((y - from.y) / (to.y - from.y)) * (to.x - from.x)) inside = !inside;
  });
  return inside;
}

/** Whether edges cross by more than the tolerance, as two bars laid over each other do. */
function crossing(a: readonly Point[], b: readonly Point[]): boolean {
  return a.some((a1, i) => {
    const a2 = a[(i + 1) % a.length] as Point;
    return b.some((b1, j) => {
      const b2 = b[(j + 1) % b.length] as Point;
      const aParts = side(b1, b2, a1) * side(b1, b2, a2) < 0;
      const bParts = side(a1, a2, b1) * side(a1, a2, b2) < 0;
      return aParts && bParts;
    });
  });
}

/** Signed distance from a line, taken as zero within the tolerance. */
function side(from: Point, to: Point, point: Point): number {
  const cross = (to.x - from.x) * (point.y - from.y) - (to.y - from.y) * (point.x - from.x);
  const away = cross / Math.hypot(to.x - from.x, to.y - from.y);
  return Math.abs(away) < tolerance ? 0 : away;
}
