import type { Point } from '../outline.ts';
import type { Segment } from './stroke.ts';

/**
 * An elliptical arc given by its ends, as SVG paths write it, by its centre and angles.
 * Source: W3C, Scalable Vector Graphics 1.1 (Second Edition), appendix F.6.5 and F.6.6.
 */
export function endpointArc(
  from: Point,
  to: Point,
  shape: { radiusX: number; radiusY: number; tilt: number },
  flags: { large: boolean; sweep: boolean },
): Segment {
  const [wideX, wideY] = [Math.abs(shape.radiusX), Math.abs(shape.radiusY)];
  if (wideX === 0 || wideY === 0 || (from.x === to.x && from.y === to.y)) {
    return { kind: 'line', to };
  }
  const [cos, sin] = [Math.cos(shape.tilt), Math.sin(shape.tilt)];
  const half = { x: (from.x - to.x) / 2, y: (from.y - to.y) / 2 };
  const x = cos * half.x + sin * half.y;
  const y = cos * half.y - sin * half.x;
  // Radii too small to reach from end to end are made just large enough.
  const reach = Math.sqrt((x / wideX) ** 2 + (y / wideY) ** 2);
  const [radiusX, radiusY] = reach > 1 ? [wideX * reach, wideY * reach] : [wideX, wideY];
  const away = Math.sqrt(Math.max(0, 1 / ((x / radiusX) ** 2 + (y / radiusY) ** 2) - 1));
  const side = flags.large === flags.sweep ? -away : away;
  const [middleX, middleY] = [(side * radiusX * y) / radiusY, (-side * radiusY * x) / radiusX];
  const centre = {
    x: cos * middleX - sin * middleY + (from.x + to.x) / 2,
    y: sin * middleX + cos * middleY + (from.y + to.y) / 2,
  };
  const start = Math.atan2((y - middleY) / radiusY, (x - middleX) / radiusX);
  const end = Math.atan2((-y - middleY) / radiusY, (-x - middleX) / radiusX);
  const sweep = swept(end - start, flags.sweep);
  return { kind: 'arc', centre, radiusX, radiusY, tilt: shape.tilt, start, sweep, to };
}

function swept(angle: number, positive: boolean): number {
  if (positive && angle < 0) return angle + 2 * Math.PI;
  return !positive && angle > 0 ? angle - 2 * Math.PI : angle;
}
