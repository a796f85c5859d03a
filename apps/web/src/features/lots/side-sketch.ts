import type { Point } from '@hidewright/domain';

/** A side while it is being drawn: its edge, its flaws, and the flaw under way. */
export interface SideSketch {
  outline: Point[];
  flaws: Point[][];
  underWay: Point[];
}

/** Corners closer than this to the one before, in mm, are not kept while a finger draws. */
const leastStep = 6;

const rounded = ({ x, y }: Point): Point => ({ x: Math.round(x), y: Math.round(y) });

/** The flaw under way with one corner more, unless it hardly moved on. */
export function withCorner(sketch: SideSketch, at: Point): SideSketch {
  const last = sketch.underWay.at(-1);
  if (last && Math.hypot(at.x - last.x, at.y - last.y) < leastStep) return sketch;
  return { ...sketch, underWay: [...sketch.underWay, rounded(at)].slice(0, 100) };
}

/** Ends the flaw under way. Too few corners are a tap: a round flaw of the size given stands for it. */
export function withFlawClosed(sketch: SideSketch, tapMm: number): SideSketch {
  const [first] = sketch.underWay;
  if (!first) return sketch;
  const flaw = sketch.underWay.length >= 3 ? sketch.underWay : roundFlaw(first, tapMm);
  return { ...sketch, flaws: [...sketch.flaws, flaw], underWay: [] };
}

/** Eight corners around a point. */
export function roundFlaw(middle: Point, acrossMm: number): Point[] {
  return Array.from({ length: 8 }, (_, at) => {
    const angle = (2 * Math.PI * at) / 8;
    return rounded({
      x: middle.x + (acrossMm / 2) * Math.cos(angle),
      y: middle.y + (acrossMm / 2) * Math.sin(angle),
    });
  });
}

export function withoutFlaw(sketch: SideSketch, at: number): SideSketch {
  return { ...sketch, flaws: sketch.flaws.filter((_, each) => each !== at) };
}

export function withOutlineCorner(sketch: SideSketch, at: number, to: Point): SideSketch {
  const outline = sketch.outline.map((corner, each) => (each === at ? rounded(to) : corner));
  return { ...sketch, outline };
}

export interface Box {
  x: number;
  y: number;
  width: number;
  height: number;
}

export function boxOf(points: readonly Point[]): Box {
  const xs = points.map(({ x }) => x);
  const ys = points.map(({ y }) => y);
  const [x, y] = [Math.min(...xs), Math.min(...ys)];
  return { x, y, width: Math.max(...xs) - x, height: Math.max(...ys) - y };
}

/** As SVG takes it, with some room around. */
export function viewBoxOf({ x, y, width, height }: Box): string {
  const margin = Math.max(width, height) * 0.03;
  return `${x - margin} ${y - margin} ${width + 2 * margin} ${height + 2 * margin}`;
}
