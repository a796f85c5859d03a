import { InvalidInput } from '../errors/domain-error.ts';
import { arcPoint, type Stretch } from './boundary.ts';
import { checkOutline } from './check-outline.ts';
import { centredPoints } from './drawn-polygon.ts';
import type { Outline, Point } from './outline.ts';
import { toMicrometre, withoutRepeats } from './ring.ts';
import { shapeOf } from './shape.ts';

/**
 * The outline as a polygon, counter-clockwise, in mm rounded to 1 µm. Its corners lie on the curve,
 * which leaves it by `toleranceMm` at most; the widest and highest points are among them. A drawn
 * polygon is given as it is, without its holes.
 * @throws InvalidInput
 */
export function outlinePolygon(outline: Outline, toleranceMm = 0.01): Point[] {
  checkOutline(outline);
  if (!(toleranceMm >= 0.0001 && toleranceMm <= 10)) {
    throw new InvalidInput('toleranceMm', 'Write the tolerance as 0.0001 to 10 mm.');
  }
  if (outline.shape === 'polygon') return centredPoints(outline);
  const shape = shapeOf(outline);
  const points =
    shape.kind === 'ellipse'
      ? ellipsePoints(shape.radiusX, shape.radiusY, toleranceMm)
      : shape.stretches.flatMap((stretch) => stretchPoints(stretch, toleranceMm));
  return withoutHairs(withoutRepeats(points.map(toMicrometre)));
}

/** Shorter than this in mm, an edge may run back on the one before it: a trace of rounding. */
const hairMm = 0.003;

/** Leaves out the ends of such edges; the curve moves by no more than their length. */
function withoutHairs(points: Point[]): Point[] {
  return points.filter((point, at) => {
    const before = points[(at + points.length - 1) % points.length] as Point;
    return Math.hypot(point.x - before.x, point.y - before.y) > hairMm;
  });
}

/** The widest step along an arc whose chord leaves it by no more than the tolerance. */
const widestStep = (radius: number, toleranceMm: number): number =>
  2 * Math.acos(Math.max(0, 1 - toleranceMm / radius));

/** A multiple of 12, so that the places where round pieces touch in alternating rows are corners. */
function ellipsePoints(radiusX: number, radiusY: number, toleranceMm: number): Point[] {
  const step = widestStep(Math.max(radiusX, radiusY), toleranceMm);
  const count = 12 * Math.ceil((2 * Math.PI) / step / 12);
  return Array.from({ length: count }, (_, at) => {
    const angle = (2 * Math.PI * at) / count;
    return { x: radiusX * Math.cos(angle), y: radiusY * Math.sin(angle) };
  });
}

function stretchPoints(stretch: Stretch, toleranceMm: number): Point[] {
  if (stretch.kind === 'line') return [stretch.from, stretch.to];
  const step = widestStep(stretch.radius, toleranceMm);
  const count = Math.max(1, Math.ceil(Math.abs(stretch.sweep) / step));
  return Array.from({ length: count + 1 }, (_, at) => arcPoint(stretch, at / count));
}
