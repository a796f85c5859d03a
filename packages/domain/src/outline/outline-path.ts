import { arcPoint, type Stretch } from './boundary.ts';
import { checkOutline } from './check-outline.ts';
import { centredHoles, centredPoints } from './drawn-polygon.ts';
import type { Outline, Point } from './outline.ts';
import { shapeOf } from './shape.ts';

/**
 * The outline as SVG path data in mm, in the same coordinates as its polygon, so that a placement
 * is drawn by `translate(x y) rotate(rot)`. (On a screen, where y points down, the whole picture is
 * mirrored, which changes nothing in it.) Holes run the other way round, so that they stay empty
 * when the path is filled.
 * @throws InvalidInput
 */
export function outlinePath(outline: Outline): string {
  checkOutline(outline);
  if (outline.shape === 'polygon') {
    return [centredPoints(outline), ...centredHoles(outline)].map(ringPath).join(' ');
  }
  const shape = shapeOf(outline);
  if (shape.kind === 'ellipse') return ellipsePath(shape.radiusX, shape.radiusY);
  const [first, ...rest] = shape.stretches;
  if (first === undefined) return '';
  const begin = first.kind === 'line' ? first.from : arcPoint(first, 0);
  return [`M ${pair(begin)}`, ...[first, ...rest].map(command), 'Z'].join(' ');
}

/** A line as path data, its corners in the order given. */
export function linePath(line: readonly Point[]): string {
  return `M ${line.map(pair).join(' L ')}`;
}

const ringPath = (ring: readonly Point[]): string => `${linePath(ring)} Z`;

function ellipsePath(radiusX: number, radiusY: number): string {
  const radii = `${number(radiusX)} ${number(radiusY)}`;
  const half = (x: number) => `A ${radii} 0 0 1 ${number(x)} 0`;
  return `M ${number(radiusX)} 0 ${half(-radiusX)} ${half(radiusX)} Z`;
}

function command(stretch: Stretch): string {
  if (stretch.kind === 'line') return `L ${pair(stretch.to)}`;
  const radius = number(stretch.radius);
  return `A ${radius} ${radius} 0 0 ${stretch.sweep > 0 ? 1 : 0} ${pair(arcPoint(stretch, 1))}`;
}

const number = (value: number): string => String(Math.round(value * 1000) / 1000 + 0);
const pair = ({ x, y }: Point): string => `${number(x)} ${number(y)}`;
