import { InvalidInput } from '../errors/domain-error.ts';
import { grown } from './clip.ts';
import { centredHoles } from './drawn-polygon.ts';
import type { Outline, Point } from './outline.ts';
import { outlinePolygon } from './polygon.ts';
import { turnedRing } from './ring.ts';

/** How closely the line follows the arcs around corners that stick into the leather, in mm. */
const withinMm = 0.005;

/**
 * The line inside an outline that keeps the same distance from every cut, holes included: artwork
 * that stays within it is safe from a die that is a little off. Given as closed lines in mm, whose
 * last point is the first again; none where the outline is too narrow for it.
 * @param marginMm 0.1 to 100
 * @throws InvalidInput
 */
export function safeLine(outline: Outline, marginMm: number): Point[][] {
  if (!(marginMm >= 0.1 && marginMm <= 100)) {
    throw new InvalidInput('safeMarginMm', 'Write the safe margin as 0.1 to 100 mm.');
  }
  const holes = outline.shape === 'polygon' ? centredHoles(outline) : [];
  const rings = [
    turnedRing(outlinePolygon(outline), 'counter-clockwise'),
    ...holes.map((hole) => turnedRing(hole, 'clockwise')),
  ];
  return grown(rings, -marginMm, withinMm).map((ring) => [...ring, ...ring.slice(0, 1)]);
}
