import { InvalidInput } from '../errors/domain-error.ts';
import type { ClosedCurve, Drawing, DrawingOptions } from './drawing.ts';
import { closedCurves, openCurves } from './drawn-curves.ts';
import { largestMm, smallestMm } from './limits.ts';
import { type Polyline, flatten } from './svg/flatten.ts';
import { joinEnds } from './svg/join-ends.ts';
import { combined, type Matrix, moved, unchanged } from './svg/matrix.ts';
import { type Drawn, type PlacedStroke, placedStrokes } from './svg/placed-strokes.ts';
import { readElements } from './svg/read-elements.ts';
import { refuseUnsafe } from './svg/refuse-unsafe.ts';
import { mostCurves, mostVertices, refusal } from './svg/refusal.ts';
import { toMillimetres } from './svg/viewport.ts';

/** Without a unit, curves are followed to this share of the drawing's size. */
const unscaledShare = 1 / 50_000;

/**
 * Finds the curves in an SVG drawing: paths, arcs, curves, circles, ellipses, rectangles, polygons
 * and lines under any transforms, followed within the tolerance. Coordinates are kept as the drawing
 * shows them, y downwards. Its size comes from width, height and viewBox in mm, cm, in, pt, pc or px
 * (96 to the inch); where they name no unit, from the one width that is told.
 * @throws InvalidInput for `drawing` (not sound, unsafe, or too much in it), `toleranceMm` or `widthMm`
 */
export function readDrawing(text: string, options: DrawingOptions = {}): Drawing {
  const { toleranceMm = 0.01, known } = options;
  checkRange(toleranceMm, 'toleranceMm', 'tolerance', 0.001, 1);
  const root = readElements(text);
  refuseUnsafe(root);
  const drawn = placedStrokes(root);
  const scale = toMillimetres(root);
  if (scale) return found(drawn, scale, toleranceMm, true);
  const unscaled = found(drawn, unchanged, unscaledTolerance(drawn), false);
  if (!known) return unscaled;
  checkRange(known.widthMm, 'widthMm', 'width', smallestMm, largestMm);
  const byMm = known.widthMm / widthOf(unscaled, known.curve ?? unscaled.likely);
  return found(drawn, { ...unchanged, a: byMm, d: byMm }, toleranceMm, true);
}

function checkRange(value: number, field: string, word: string, min: number, max: number): void {
  if (value >= min && value <= max) return;
  throw new InvalidInput(field, `Write the ${word} as ${min} to ${max} mm.`);
}

function widthOf({ closed }: Drawing, id: number | null): number {
  const curve = closed.find((each) => each.id === id);
  if (curve && curve.width > 0) return curve.width;
  throw new InvalidInput('widthMm', 'Choose the closed curve whose width it is.');
}

function unscaledTolerance({ strokes }: Drawn): number {
  let most = 0;
  for (const { stroke, matrix } of strokes) {
    const first = moved(matrix, stroke.from);
    for (const segment of stroke.segments) {
      const place = moved(matrix, segment.to);
      most = Math.max(most, Math.abs(place.x - first.x), Math.abs(place.y - first.y));
      if (segment.kind === 'arc') most = Math.max(most, segment.radiusX, segment.radiusY);
    }
  }
  return (most > 0 ? most : 1) * unscaledShare;
}

function found(
  { strokes, texts, shares }: Drawn,
  scale: Matrix,
  tolerance: number,
  mm: boolean,
): Drawing {
  const lines = joinEnds(flattened(strokes, scale, tolerance), tolerance);
  const { closed, repeated, flat } = closedCurves(lines, tolerance);
  const open = openCurves(lines);
  if (closed.length + open.length > mostCurves) throw tooManyCurves();
  return {
    unit: mm ? 'mm' : 'drawing units',
    needsWidth: !mm,
    tolerance,
    closed,
    open,
    likely: likelyOf(closed),
    leftOut: leftOut({ texts, shares, repeated, flat }),
  };
}

function flattened(strokes: PlacedStroke[], scale: Matrix, tolerance: number) {
  const budget = { vertices: mostVertices };
  return strokes.map(({ stroke, matrix }, id): Polyline & { id: number } => ({
    id,
    ...flatten(stroke, combined(scale, matrix), tolerance, budget),
  }));
}

const likelyOf = ([largest]: ClosedCurve[]): number | null => largest?.id ?? null;

function leftOut(counts: Record<'texts' | 'shares' | 'repeated' | 'flat', number>): string[] {
  const { texts, shares, repeated, flat } = counts;
  const sentences: string[] = [];
  if (texts > 0) sentences.push('Lettering is left out: turn it into curves if it is to be cut.');
  if (shares > 0) sentences.push('What is measured in per cent, as a background is, is left out.');
  if (repeated > 0) sentences.push(`${curves(repeated)} drawn twice, and kept once.`);
  if (flat > 0) sentences.push(`${curves(flat)} without any area, and left out.`);
  return sentences;
}

const curves = (count: number): string => (count === 1 ? '1 curve is' : `${count} curves are`);

const tooManyCurves = () =>
  refusal(
    `The drawing has more than ${mostCurves.toLocaleString('en')} curves. Leave only what is cut in it.`,
  );
