import { InvalidInput } from '../errors/domain-error.ts';
import { arcPoint, type Stretch } from './boundary.ts';
import { checkOutline } from './check-outline.ts';
import type { Outline, Point } from './outline.ts';
import { shapeOf } from './shape.ts';

/**
 * The outline as a polygon, counter-clockwise, in mm rounded to 1 µm. Its corners lie on the curve,
 * which leaves it by `toleranceMm` at most; the widest and highest points are among them.
 * @throws InvalidInput
 */
export function outlinePolygon(outline: Outline, toleranceMm = 0.01): Point[] {
  checkOutline(outline);
  if (!(toleranceMm >= 0.0001 && toleranceMm <= 10)) {
    throw new InvalidInput('toleranceMm', 'Write the tolerance as 0.0001 to 10 mm.');
  }
  const shape = shapeOf(outline);
  const points =
    shape.kind === 'ellipse'
      ? ellipsePoints(shape.radiusX, shape.radiusY, toleranceMm)
      : shape.stretches.flatMap((stretch) => stretchPoints(stretch, toleranceMm));
  return withoutRepeats(points.map(toMicrometre));
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

// Rounding the size and putting the sign back keeps an outline that is symmetrical symmetrical.
const micrometre = (value: number): number =>
  (Math.sign(value) * Math.round(Math.abs(value) * 1000)) / 1000 + 0;

const toMicrometre = ({ x, y }: Point): Point => ({ x: micrometre(x), y: micrometre(y) });

function withoutRepeats(points: Point[]): Point[] {
  return points.filter((point, at) => {
    const before = points[(at + points.length - 1) % points.length];
    return before === undefined || point.x !== before.x || point.y !== before.y;
  });
}
