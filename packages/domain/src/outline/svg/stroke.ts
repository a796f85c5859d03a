import type { Point } from '../outline.ts';

/** A stretch of a drawn line, from wherever the one before it ends. */
export type Segment =
  | { kind: 'line'; to: Point }
  | { kind: 'quadratic'; handle: Point; to: Point }
  | { kind: 'cubic'; handles: readonly [Point, Point]; to: Point }
  | (EllipseArc & { kind: 'arc'; to: Point });

/** Part of an ellipse whose axes are turned by `tilt`; angles in radians along it. */
export interface EllipseArc {
  centre: Point;
  radiusX: number;
  radiusY: number;
  tilt: number;
  start: number;
  sweep: number;
}

/** A line as it was drawn, in its element's own coordinates. */
export interface Stroke {
  from: Point;
  segments: Segment[];
  closed: boolean;
}

export function arcPlace(arc: EllipseArc, share: number): Point {
  const angle = arc.start + arc.sweep * share;
  const [x, y] = [arc.radiusX * Math.cos(angle), arc.radiusY * Math.sin(angle)];
  const [cos, sin] = [Math.cos(arc.tilt), Math.sin(arc.tilt)];
  return { x: arc.centre.x + x * cos - y * sin, y: arc.centre.y + x * sin + y * cos };
}

/** A whole ellipse from its rightmost point. */
export function ellipseStroke(centre: Point, radiusX: number, radiusY: number): Stroke {
  const arc = { centre, radiusX, radiusY, tilt: 0, start: 0, sweep: 2 * Math.PI };
  const from = arcPlace(arc, 0);
  return { from, segments: [{ kind: 'arc', ...arc, to: from }], closed: true };
}
