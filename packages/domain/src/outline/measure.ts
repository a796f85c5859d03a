import { stretchArea, stretchLength } from './boundary.ts';
import { checkOutline } from './check-outline.ts';
import type { Bounds, DrawnPolygon, Outline, Point } from './outline.ts';
import { centredPoints } from './drawn-polygon.ts';
import { ringBounds, ringLength } from './ring.ts';
import { shapeOf } from './shape.ts';

/** Area inside the outline in mm², of the true curve; punched holes are not taken off. @throws InvalidInput */
export function outlineArea(outline: Outline): number {
  checkOutline(outline);
  const shape = shapeOf(outline);
  if (shape.kind === 'ellipse') return Math.PI * shape.radiusX * shape.radiusY;
  return shape.stretches.reduce((sum, stretch) => sum + stretchArea(stretch), 0);
}

/** Length of the cutting edge that the die needs, in mm, punched holes included. @throws InvalidInput */
export function cuttingEdgeMm(outline: Outline): number {
  checkOutline(outline);
  return aroundMm(outline) + punchedMm(outline);
}

function aroundMm(outline: Outline): number {
  const shape = shapeOf(outline);
  if (shape.kind === 'ellipse') return ellipseLength(shape.radiusX, shape.radiusY);
  return shape.stretches.reduce((sum, stretch) => sum + stretchLength(stretch), 0);
}

function punchedMm(outline: Outline): number {
  const punched = outline.shape === 'polygon' ? (outline.punched ?? []) : [];
  return punched.reduce((sum, hole) => sum + ringLength(hole), 0);
}

/** The trapezoid rule on a smooth periodic function: beyond 12 digits for any oval of the trade. */
function ellipseLength(radiusX: number, radiusY: number): number {
  const steps = 1024;
  let sum = 0;
  for (let at = 0; at < steps; at += 1) {
    const angle = (2 * Math.PI * at) / steps;
    sum += Math.hypot(radiusX * Math.sin(angle), radiusY * Math.cos(angle));
  }
  return (2 * Math.PI * sum) / steps;
}

/** The smallest upright box around the outline, in mm. @throws InvalidInput */
export function outlineBounds(outline: Outline): Bounds {
  checkOutline(outline);
  if (outline.shape === 'polygon') return ringBounds(centredPoints(outline));
  const [width, height] = sizeOf(outline);
  return { minX: -width / 2, minY: -height / 2, maxX: width / 2, maxY: height / 2 };
}

function sizeOf(outline: Exclude<Outline, DrawnPolygon>): [width: number, height: number] {
  if (outline.shape === 'round') return [outline.diameterMm, outline.diameterMm];
  if (outline.shape === 'tag') return [outline.lengthMm, outline.widthMm];
  return [outline.widthMm, outline.heightMm];
}

/** Whether the outline looks the same after half a turn. */
export function isSameHalfTurned(outline: Outline): boolean {
  if (outline.shape === 'polygon') return isPointSymmetric(centredPoints(outline));
  return outline.shape !== 'tag';
}

/** Within a hundredth of a millimetre, as curves are followed. */
function isPointSymmetric(points: readonly Point[]): boolean {
  if (points.length % 2 === 1) return false;
  const half = points.length / 2;
  return points.slice(0, half).every((point, at) => {
    const opposite = points[at + half];
    return opposite && Math.hypot(point.x + opposite.x, point.y + opposite.y) <= 0.01;
  });
}
