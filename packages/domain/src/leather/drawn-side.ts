import { InvalidInput } from '../errors/domain-error.ts';
import { areaWithout } from '../outline/clip.ts';
import type { Point } from '../outline/outline.ts';
import { findCrossing } from '../outline/crossing.ts';
import { type Ring, ringArea, ringBounds, toMicrometre, withoutRepeats } from '../outline/ring.ts';

/** A side, hide or other piece of leather as drawn: its edge and its flaws, in mm. */
export interface DrawnSide {
  outline: Point[];
  flaws: Point[][];
}

export const sideLimits = {
  outlineCorners: 400,
  flaws: 60,
  flawCorners: 100,
  largestMm: 6000,
  smallestMm: 20,
} as const;

/**
 * A drawing of a side, its corners in whole micrometres. Flaws may lie over each other and over the
 * edge; no curve may cross itself.
 * @throws InvalidInput for `outline` or `flaws.N`, naming the place
 */
export function soundSide({ outline, flaws }: DrawnSide): DrawnSide {
  if (flaws.length > sideLimits.flaws) {
    throw new InvalidInput('flaws', `Draw at most ${sideLimits.flaws} flaws; join small ones.`);
  }
  return {
    outline: soundCurve(outline, 'outline', 'edge', sideLimits.outlineCorners),
    flaws: flaws.map((flaw, at) =>
      soundCurve(flaw, `flaws.${at}`, `flaw ${at + 1}`, sideLimits.flawCorners),
    ),
  };
}

function soundCurve(ring: Ring, field: string, name: string, most: number): Point[] {
  if (ring.length > most) {
    throw new InvalidInput(field, `Draw the ${name} with at most ${most} corners.`);
  }
  const { largestMm } = sideLimits;
  if (!ring.every(({ x, y }) => Math.abs(x) <= largestMm && Math.abs(y) <= largestMm)) {
    throw new InvalidInput(field, `Keep the ${name} within ${largestMm} mm.`);
  }
  const whole = withoutRepeats(ring.map(toMicrometre));
  if (whole.length < 3) {
    throw new InvalidInput(field, `Draw the ${name} with at least three corners.`);
  }
  const crossing = findCrossing([whole]);
  if (crossing) {
    const place = `x ${Math.round(crossing.x)}, y ${Math.round(crossing.y)} mm`;
    throw new InvalidInput(
      field,
      `The ${name} ${crossing.how} itself near ${place}. Draw it anew.`,
    );
  }
  if (!(Math.abs(ringArea(whole)) > 1)) {
    throw new InvalidInput(field, `The ${name} encloses nothing. Draw it larger.`);
  }
  return whole;
}

/** The area inside a drawn edge in mm², flaws included. */
export const drawnAreaMm2 = (outline: Ring): number => Math.abs(ringArea(outline));

/** The area inside a drawn edge in mm² less its flaws, which may lie over each other and over the edge. */
export const soundAreaMm2 = ({ outline, flaws }: DrawnSide): number =>
  flaws.length === 0 ? drawnAreaMm2(outline) : areaWithout(outline, flaws);

/**
 * A side as one usually looks, spine along the top (y runs down), neck to the right: something to
 * start drawing from. Our own sketch; its edge encloses the area given (mm²), with its corner at the origin.
 */
export function usualSide(areaMm2: number): Point[] {
  if (!(areaMm2 > 0)) throw new InvalidInput('areaMm2', 'Enter the measured area first.');
  const scale = Math.sqrt(areaMm2 / drawnAreaMm2(sketch));
  const { minX, minY } = ringBounds(sketch);
  return sketch.map(({ x, y }) => toMicrometre({ x: (x - minX) * scale, y: (y - minY) * scale }));
}

/** Rump at the left, neck at the right; heights above the belly's lowest point, while y runs down. */
const sketch: Point[] = [
  [0, 560],
  [30, 860],
  [140, 1000],
  [420, 1030],
  [900, 1020],
  [1500, 1030],
  [1980, 1010],
  [2230, 960],
  [2400, 900],
  [2420, 700],
  [2330, 560],
  [2220, 500],
  [2200, 340],
  [2290, 130],
  [2210, 60],
  [2050, 150],
  [1930, 250],
  [1600, 210],
  [1200, 200],
  [800, 230],
  [540, 240],
  [420, 140],
  [330, 0],
  [210, 10],
  [190, 190],
  [110, 360],
].map(([x = 0, y = 0]) => ({ x, y: 1030 - y }));
