import type { Point } from './outline.ts';

/** A stretch of a boundary; an arc runs from angle `start` over `sweep` radians, counter-clockwise if positive. */
export type Stretch =
  | { kind: 'line'; from: Point; to: Point }
  | { kind: 'arc'; centre: Point; radius: number; start: number; sweep: number };

/** A corner to be rounded: its place, and the radius wanted there. */
export interface Corner extends Point {
  radius: number;
}

/** The point of an arc at a share (0 to 1) of its sweep. */
export function arcPoint(arc: Extract<Stretch, { kind: 'arc' }>, share: number): Point {
  const angle = arc.start + arc.sweep * share;
  return {
    x: arc.centre.x + arc.radius * Math.cos(angle),
    y: arc.centre.y + arc.radius * Math.sin(angle),
  };
}

/** How far from a corner its rounding begins, for a radius and the angle by which the path turns. */
export function tangentLength(radius: number, turn: number): number {
  return radius * Math.tan(Math.abs(turn) / 2);
}

/** Joins corners (counter-clockwise) by straight lines and rounds each by an arc tangent to both. */
export function roundCorners(corners: readonly Corner[]): Stretch[] {
  const arcs = corners.map((corner, at) =>
    cornerArc(neighbour(corners, at, -1), corner, neighbour(corners, at, 1)),
  );
  return arcs.flatMap((arc, at) => {
    const line = {
      kind: 'line' as const,
      from: arcPoint(neighbour(arcs, at, -1), 1),
      to: arcPoint(arc, 0),
    };
    const stretches: Stretch[] = isLongEnough(line) ? [line] : [];
    return arc.radius > 0 ? [...stretches, arc] : stretches;
  });
}

function neighbour<T>(list: readonly T[], at: number, by: number): T {
  return list[(at + by + list.length) % list.length] as T;
}

const isLongEnough = ({ from, to }: { from: Point; to: Point }): boolean =>
  Math.hypot(to.x - from.x, to.y - from.y) > 1e-9;

function cornerArc(before: Point, corner: Corner, after: Point) {
  const into = Math.atan2(corner.y - before.y, corner.x - before.x);
  const outOf = Math.atan2(after.y - corner.y, after.x - corner.x);
  const turn = Math.atan2(Math.sin(outOf - into), Math.cos(outOf - into));
  const back = tangentLength(corner.radius, turn);
  const side = Math.sign(turn);
  // From the point of tangency the centre lies at right angles to the way in, on the inner side.
  const centre = {
    x: corner.x - back * Math.cos(into) - side * corner.radius * Math.sin(into),
    y: corner.y - back * Math.sin(into) + side * corner.radius * Math.cos(into),
  };
  const start = into - (side * Math.PI) / 2;
  return { kind: 'arc' as const, centre, radius: corner.radius, start, sweep: turn };
}

/** Signed area under a stretch by Green's theorem: ½∮(x dy − y dx). */
export function stretchArea(stretch: Stretch): number {
  if (stretch.kind === 'line') {
    return (stretch.from.x * stretch.to.y - stretch.to.x * stretch.from.y) / 2;
  }
  const { centre, radius, start, sweep } = stretch;
  const end = start + sweep;
  const moved =
    centre.x * (Math.sin(end) - Math.sin(start)) - centre.y * (Math.cos(end) - Math.cos(start));
  return (radius * radius * sweep + radius * moved) / 2;
}

/** Length of a stretch. */
export function stretchLength(stretch: Stretch): number {
  return stretch.kind === 'line'
    ? Math.hypot(stretch.to.x - stretch.from.x, stretch.to.y - stretch.from.y)
    : stretch.radius * Math.abs(stretch.sweep);
}
