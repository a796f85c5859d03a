import type { Element } from './read-elements.ts';
import { lengthInMm, readLength } from './lengths.ts';
import { type Matrix, unchanged } from './matrix.ts';
import { readNumbers } from './read-numbers.ts';
import { refusal } from './refusal.ts';

interface Box {
  x: number;
  y: number;
  width: number;
  height: number;
}

/** @throws InvalidInput where there is one that cannot be read */
function viewBoxOf({ attributes }: Element): Box | null {
  const text = attributes.get('viewBox');
  if (text === undefined) return null;
  const [x, y, width, height] = readNumbers(text) ?? [];
  if (x === undefined || y === undefined || !(width && width > 0) || !(height && height > 0)) {
    throw refusal(`The drawing’s viewBox cannot be read: “${text.slice(0, 40)}”.`);
  }
  return { x, y, width, height };
}

/** From the drawing's user units to mm by its width or height; null where neither names a unit. */
export function toMillimetres(svg: Element): Matrix | null {
  const [width, height] = ['width', 'height'].map((side) => lengthInMm(svg.attributes.get(side)));
  if (!isSize(width) && !isSize(height)) return null;
  const box = viewBoxOf(svg);
  if (!box) return { ...unchanged, a: 25.4 / 96, d: 25.4 / 96 };
  return fitted(box, isSize(width) ? width : null, isSize(height) ? height : null, svg);
}

/** A viewBox within an element that has a place of its own in user units, such as an inner svg. */
export function innerViewport(
  element: Element,
  width: string | undefined,
  height: string | undefined,
) {
  const box = viewBoxOf(element);
  const sides = [width, height].map((side) => readLength(side)?.value);
  if (!box || !isSize(sides[0]) || !isSize(sides[1])) return unchanged;
  return fitted(box, sides[0], sides[1], element);
}

const isSize = (value: number | null | undefined): value is number =>
  value !== null && value !== undefined && value > 0;

/** As `preserveAspectRatio` asks: the same scale both ways and in the middle, unless it says none. */
function fitted(box: Box, width: number | null, height: number | null, element: Element): Matrix {
  const [byWidth, byHeight] = [(width ?? 0) / box.width, (height ?? 0) / box.height];
  const asked = element.attributes.get('preserveAspectRatio') ?? '';
  if (width !== null && height !== null && asked.includes('none')) {
    return { a: byWidth, b: 0, c: 0, d: byHeight, e: -box.x * byWidth, f: -box.y * byHeight };
  }
  const scale = scaleOf(width, height, byWidth, byHeight, asked);
  const left = ((width ?? box.width * scale) - box.width * scale) * share(asked, 'x');
  const top = ((height ?? box.height * scale) - box.height * scale) * share(asked, 'Y');
  return { a: scale, b: 0, c: 0, d: scale, e: left - box.x * scale, f: top - box.y * scale };
}

function scaleOf(
  width: number | null,
  height: number | null,
  byWidth: number,
  byHeight: number,
  asked: string,
): number {
  if (width === null) return byHeight;
  if (height === null) return byWidth;
  return asked.includes('slice') ? Math.max(byWidth, byHeight) : Math.min(byWidth, byHeight);
}

function share(asked: string, axis: 'x' | 'Y'): number {
  if (asked.includes(`${axis}Min`)) return 0;
  return asked.includes(`${axis}Max`) ? 1 : 0.5;
}
