import { InvalidInput } from '../errors/domain-error.ts';
import { checkDrawnPolygon } from './check-polygon.ts';
import type { ClosedCurve, Drawing } from './drawing.ts';
import { centredHoles, centredPoints } from './drawn-polygon.ts';
import type { DrawnPolygon, Point } from './outline.ts';
import { type Ring, toMicrometre, withoutRepeats } from './ring.ts';

/** The closed curves that lie in a chosen one, at any depth: a guide line may lie around a hole. */
export function holesWithin({ closed }: Drawing, chosen: number): ClosedCurve[] {
  const inside = new Set([chosen]);
  // Larger ones come first, so what a curve lies in has been seen before it.
  return closed.filter(({ id, within }) => {
    if (within === null || !inside.has(within)) return false;
    inside.add(id);
    return true;
  });
}

/**
 * The outline that a die cuts, from the curve chosen in a drawing and the holes kept in it. Corners
 * that lie on the line between their neighbours are left out.
 * @throws InvalidInput for `curve` or `widthMm` where the choice makes no outline, for `points` or
 * `punched` where it makes one that cannot be cut; places are in mm of the drawing
 */
export function outlineFromDrawing(
  drawing: Drawing,
  chosen: number,
  kept: readonly number[] = [],
): DrawnPolygon {
  if (drawing.needsWidth) {
    throw new InvalidInput('widthMm', 'Write how wide the piece is: the drawing says no unit.');
  }
  const curve = curveOf(drawing, chosen);
  const inside = holesWithin(drawing, chosen).map(({ id }) => id);
  const holes = kept.map((id) => {
    if (inside.includes(id)) return tidied(curveOf(drawing, id).points);
    throw new InvalidInput('punched', 'Keep only holes that lie in the chosen curve.');
  });
  const drawn: DrawnPolygon = { shape: 'polygon', points: tidied(curve.points), punched: holes };
  checkDrawnPolygon(drawn);
  const points = centredPoints(drawn);
  return holes.length === 0
    ? { shape: 'polygon', points }
    : { shape: 'polygon', points, punched: centredHoles(drawn) };
}

function curveOf({ closed }: Drawing, id: number): ClosedCurve {
  const curve = closed.find((each) => each.id === id);
  if (curve) return curve;
  throw new InvalidInput('curve', 'Choose one of the closed curves of the drawing.');
}

/** Half a micrometre, which rounding moves corners by anyhow. */
const straight = 0.0005;

/** Whole micrometres, without corners that lie in a straight line or stand on a line that doubles back. */
function tidied(ring: Ring): Point[] {
  const kept: Point[] = [];
  for (const point of withoutRepeats(ring.map(toMicrometre))) {
    while (kept.length > 1 && isNeedless(kept.at(-2) as Point, kept.at(-1) as Point, point)) {
      kept.pop();
    }
    const last = kept.at(-1);
    if (!last || last.x !== point.x || last.y !== point.y) kept.push(point);
  }
  return kept;
}

function isNeedless(from: Point, corner: Point, to: Point): boolean {
  const cross = (to.x - from.x) * (corner.y - from.y) - (to.y - from.y) * (corner.x - from.x);
  const across = Math.hypot(to.x - from.x, to.y - from.y);
  if (across === 0) return true;
  return Math.abs(cross) <= straight * across && isExact(from, corner, to, across);
}

/** Along a gentle curve many small steps must not add up: only what truly lies between is needless. */
function isExact(from: Point, corner: Point, to: Point, across: number): boolean {
  const [there, on] = [
    Math.hypot(corner.x - from.x, corner.y - from.y),
    Math.hypot(to.x - corner.x, to.y - corner.y),
  ];
  return there + on - across < 1e-9 || there > across || on > across;
}
