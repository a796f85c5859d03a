import { roundCorners } from '../boundary.ts';
import type { Point } from '../outline.ts';
import { userUnits } from './lengths.ts';
import { pathStrokes } from './path-strokes.ts';
import type { Element } from './read-elements.ts';
import { readNumbers } from './read-numbers.ts';
import { refusal } from './refusal.ts';
import { ellipseStroke, type Stroke } from './stroke.ts';

const drawn: Record<string, (element: Element) => Stroke[]> = {
  path: ({ attributes }) => pathStrokes(attributes.get('d') ?? ''),
  rect: rectangle,
  circle: (element) => {
    const radius = userUnits(element, 'r');
    return radius > 0 ? [ellipseStroke(middleOf(element), radius, radius)] : [];
  },
  ellipse: (element) => {
    const [x, y] = [userUnits(element, 'rx'), userUnits(element, 'ry')];
    return x > 0 && y > 0 ? [ellipseStroke(middleOf(element), x, y)] : [];
  },
  line: (element) => {
    const [x1 = 0, y1 = 0, x2 = 0, y2 = 0] = ['x1', 'y1', 'x2', 'y2'].map((name) =>
      userUnits(element, name),
    );
    return joined(
      [
        { x: x1, y: y1 },
        { x: x2, y: y2 },
      ],
      false,
    );
  },
  polyline: (element) => joined(pointsOf(element), false),
  polygon: (element) => joined(pointsOf(element), true),
};

/** What an element draws, in its own coordinates; nothing for those that only group or explain. */
export function shapeStrokes(element: Element): Stroke[] {
  return drawn[element.name]?.(element) ?? [];
}

const measures = ['x', 'y', 'width', 'height', 'rx', 'ry', 'cx', 'cy', 'r', 'x1', 'y1', 'x2', 'y2'];

/** Whether a shape is a share of the whole picture, such as a background, and so of no size of its own. */
export function isShare({ name, attributes }: Element): boolean {
  if (drawn[name] === undefined) return false;
  return measures.some((measure) => attributes.get(measure)?.trim().endsWith('%'));
}

const middleOf = (element: Element): Point => ({
  x: userUnits(element, 'cx'),
  y: userUnits(element, 'cy'),
});

function joined([from, ...rest]: Point[], closed: boolean): Stroke[] {
  if (!from || rest.length === 0) return [];
  return [{ from, segments: rest.map((to) => ({ kind: 'line', to })), closed }];
}

function pointsOf({ name, attributes }: Element): Point[] {
  const text = attributes.get('points') ?? '';
  const numbers = readNumbers(text);
  if (!numbers || numbers.length % 2 === 1) {
    throw refusal(`The points of a ${name} cannot be read: “${text.trim().slice(0, 40)}”.`);
  }
  return Array.from({ length: numbers.length / 2 }, (_, at) => ({
    x: numbers[2 * at] as number,
    y: numbers[2 * at + 1] as number,
  }));
}

/** Where only one of the corner's radii is given, it holds for the other as well. */
function rectangle(element: Element): Stroke[] {
  const [x = 0, y = 0, width = 0, height = 0, rx = 0, ry = 0] = [
    'x',
    'y',
    'width',
    'height',
    'rx',
    'ry',
  ].map((name) => userUnits(element, name));
  if (!(width > 0 && height > 0)) return [];
  const radiusX = Math.min(rx > 0 ? rx : ry, width / 2);
  const radiusY = Math.min(ry > 0 ? ry : rx, height / 2);
  const corner = { x, y, width, height };
  return radiusX > 0 && radiusY > 0
    ? [roundedRectangle(corner, radiusX, radiusY)]
    : joined(cornersOf(corner), true);
}

interface Box {
  x: number;
  y: number;
  width: number;
  height: number;
}

const cornersOf = ({ x, y, width, height }: Box): Point[] => [
  { x, y },
  { x: x + width, y },
  { x: x + width, y: y + height },
  { x, y: y + height },
];

/** Rounded by circles in a rectangle that is then stretched, since its corners may be elliptical. */
function roundedRectangle({ x, y, width, height }: Box, radiusX: number, radiusY: number): Stroke {
  const stretch = radiusY / radiusX;
  const corners = cornersOf({ x: 0, y: 0, width, height: height / stretch });
  const stretches = roundCorners(corners.map((corner) => ({ ...corner, radius: radiusX })));
  const placed = (point: Point): Point => ({ x: x + point.x, y: y + point.y * stretch });
  const segments = stretches.map((each): Stroke['segments'][number] => {
    if (each.kind === 'line') return { kind: 'line', to: placed(each.to) };
    const { centre, radius, start, sweep } = each;
    const end = {
      x: centre.x + radius * Math.cos(start + sweep),
      y: centre.y + radius * Math.sin(start + sweep),
    };
    const ellipse = { centre: placed(centre), radiusX: radius, radiusY: radius * stretch, tilt: 0 };
    return { kind: 'arc', ...ellipse, start, sweep, to: placed(end) };
  });
  const [first] = stretches;
  const from = first?.kind === 'line' ? first.from : arcStart(first);
  return { from: placed(from), segments, closed: true };
}

function arcStart(arc: { centre: Point; radius: number; start: number } | undefined): Point {
  if (!arc) return { x: 0, y: 0 };
  const { centre, radius, start } = arc;
  return { x: centre.x + radius * Math.cos(start), y: centre.y + radius * Math.sin(start) };
}
