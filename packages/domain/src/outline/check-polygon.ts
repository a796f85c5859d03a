import { InvalidInput } from '../errors/domain-error.ts';
import { type Crossing, findCrossing } from './crossing.ts';
import { largestMm, mostCorners, mostHoles, smallestMm } from './limits.ts';
import type { DrawnPolygon, Point } from './outline.ts';
import {
  type Ring,
  ringArea,
  ringBounds,
  ringContains,
  toMicrometre,
  withoutRepeats,
} from './ring.ts';

/** What a hole must be at least, in mm: a punch of half a millimetre. */
const smallestHoleMm = 0.5;
const farthestMm = 10_000;

/**
 * Refuses a drawn outline that no die can cut: fewer than three corners or more than 3,000, a side
 * beyond 1 to 5,000 mm, almost no area, a curve that crosses or touches itself, a hole that is not
 * wholly inside or meets another.
 * @throws InvalidInput for `points` or `punched`; the sentence names the place, in the polygon's own mm
 */
export function checkDrawnPolygon({ points, punched = [] }: DrawnPolygon): void {
  checkCount(points, punched);
  const around = soundRing(points, 'points', 'outline', smallestMm);
  const holes = punched.map((hole, at) =>
    soundRing(hole, 'punched', `hole ${at + 1}`, smallestHoleMm),
  );
  const crossing = findCrossing([around, ...holes]);
  if (crossing) throw refusalOf(crossing);
  checkArea(around, 'points', 'outline', smallestMm);
  holes.forEach((hole, at) => checkArea(hole, 'punched', `hole ${at + 1}`, smallestHoleMm));
  holes.forEach((hole, at) => checkInside(hole, at, around, holes));
}

function checkCount(points: Ring, punched: readonly Ring[]): void {
  if (points.length < 3) {
    throw new InvalidInput('points', 'Draw the outline with at least three corners.');
  }
  if (punched.length > mostHoles) {
    throw new InvalidInput('punched', `Keep at most ${mostHoles} holes.`);
  }
  const corners = punched.reduce((sum, hole) => sum + hole.length, points.length);
  if (corners > mostCorners) {
    throw new InvalidInput(
      points.length > mostCorners ? 'points' : 'punched',
      `The drawing has ${corners} corners, of which at most ${mostCorners} can be kept. ` +
        'Simplify its curves, or keep fewer holes.',
    );
  }
}

/** The ring in whole micrometres without repeated corners. */
function soundRing(ring: Ring, field: string, name: string, least: number): Point[] {
  ring.forEach(({ x, y }, at) => {
    if (Math.abs(x) <= farthestMm && Math.abs(y) <= farthestMm) return;
    throw new InvalidInput(
      field,
      `Corner ${at + 1} of the ${name} lies nowhere: write x and y in mm, up to ${farthestMm}.`,
    );
  });
  const whole = withoutRepeats(ring.map(toMicrometre));
  const { minX, minY, maxX, maxY } = ringBounds(whole);
  const [width, height] = [maxX - minX, maxY - minY];
  if (Math.max(width, height) > largestMm) {
    throw new InvalidInput(field, `Make the ${name} at most ${largestMm} mm long and wide.`);
  }
  // A millionth of slack, since sizes are differences of rounded numbers.
  if (whole.length < 3 || Math.min(width, height) < least - 1e-6) {
    throw tooSmall(field, name, whole[0], least);
  }
  return whole;
}

function checkArea(ring: Ring, field: string, name: string, least: number): void {
  if (Math.abs(ringArea(ring)) < (least * least) / 2) throw tooSmall(field, name, ring[0], least);
}

function tooSmall(field: string, name: string, corner: Point | undefined, least: number) {
  const place = corner ? ` near ${placeOf(corner)}` : '';
  const sentence = `The ${name}${place} encloses almost nothing: make it at least ${least} mm each way.`;
  return new InvalidInput(field, sentence);
}

function refusalOf(crossing: Crossing): InvalidInput {
  const [a, b] = [Math.min(...crossing.rings), Math.max(...crossing.rings)];
  const name = (ring: number) => (ring === 0 ? 'outline' : `hole ${ring}`);
  const other = a === b ? 'itself' : `the ${name(a)}`;
  const sentence = `The ${name(b)} ${crossing.how} ${other} near ${placeOf(crossing)}.`;
  return new InvalidInput(b === 0 ? 'points' : 'punched', sentence);
}

function checkInside(hole: Ring, at: number, around: Ring, holes: readonly Ring[]): void {
  const corner = hole[0] as Point;
  if (!ringContains(around, corner)) {
    const sentence = `Hole ${at + 1} near ${placeOf(corner)} lies outside the outline.`;
    throw new InvalidInput('punched', sentence);
  }
  const outer = holes.findIndex((other) => other !== hole && ringContains(other, corner));
  if (outer === -1) return;
  throw new InvalidInput(
    'punched',
    `Hole ${at + 1} near ${placeOf(corner)} lies within hole ${outer + 1}. Keep one of the two.`,
  );
}

const placeOf = ({ x, y }: Point): string => `x ${x.toFixed(1)}, y ${y.toFixed(1)} mm`;
