import { type Corner, roundCorners, type Stretch, tangentLength } from './boundary.ts';
import { centredPoints } from './drawn-polygon.ts';
import type { Outline, Point, Rectangle, Tag } from './outline.ts';

/** An outline as geometry: an ellipse about the origin, or a closed chain of lines and arcs. */
export type Shape =
  { kind: 'ellipse'; radiusX: number; radiusY: number } | { kind: 'chain'; stretches: Stretch[] };

/** The curve of an outline, counter-clockwise. The outline has been checked. */
export function shapeOf(outline: Outline): Shape {
  switch (outline.shape) {
    case 'round':
      return {
        kind: 'ellipse',
        radiusX: outline.diameterMm / 2,
        radiusY: outline.diameterMm / 2,
      };
    case 'oval':
      return { kind: 'ellipse', radiusX: outline.widthMm / 2, radiusY: outline.heightMm / 2 };
    case 'rectangle':
      return { kind: 'chain', stretches: roundCorners(rectangleCorners(outline)) };
    case 'tag':
      return { kind: 'chain', stretches: roundCorners(tagCorners(outline)) };
    case 'polygon':
      return { kind: 'chain', stretches: straightLines(centredPoints(outline)) };
  }
}

const straightLines = (ring: readonly Point[]): Stretch[] =>
  ring.map((from, at) => ({ kind: 'line', from, to: ring[(at + 1) % ring.length] as Point }));

function rectangleCorners({ widthMm, heightMm, cornerRadiusMm: radius }: Rectangle): Corner[] {
  const [x, y] = [widthMm / 2, heightMm / 2];
  return [
    { x: -x, y: -y, radius },
    { x, y: -y, radius },
    { x, y, radius },
    { x: -x, y, radius },
  ];
}

/** The far corners get the radius asked for; shoulder and neck as much of it as they have room for. */
function tagCorners(tag: Tag): Corner[] {
  const radius = tag.cornerRadiusMm;
  const [halfLength, halfWidth, halfNeck] = [
    tag.lengthMm / 2,
    tag.widthMm / 2,
    tag.neckWidthMm / 2,
  ];
  const bodyMm = tag.lengthMm - tag.neckLengthMm;
  const shoulderMm = Math.min(halfWidth - halfNeck, bodyMm / 2);
  const neckX = halfLength - tag.neckLengthMm;
  const shoulderX = neckX - shoulderMm;
  const slopeMm = Math.hypot(shoulderMm, halfWidth - halfNeck);
  const turn = Math.atan2(halfWidth - halfNeck, shoulderMm);
  const sideLeft = bodyMm - shoulderMm - radius;
  const shoulderRadius = atMost(radius, Math.min(sideLeft, slopeMm / 2), turn);
  const neckRadius = atMost(radius, Math.min(tag.neckLengthMm, slopeMm) / 2, turn);
  const tipRadius = Math.min(radius, halfNeck, tag.neckLengthMm / 2);
  const lower: Corner[] = [
    { x: -halfLength, y: -halfWidth, radius },
    { x: shoulderX, y: -halfWidth, radius: shoulderRadius },
    { x: neckX, y: -halfNeck, radius: neckRadius },
    { x: halfLength, y: -halfNeck, radius: tipRadius },
  ];
  return [...lower, ...lower.map((corner) => ({ ...corner, y: -corner.y })).reverse()];
}

/** The largest radius up to the wanted one whose rounding needs no more than `room` of either side. */
const atMost = (wanted: number, room: number, turn: number): number =>
  Math.min(wanted, Math.max(0, room) / tangentLength(1, turn));
