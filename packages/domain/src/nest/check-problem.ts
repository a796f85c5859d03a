import { InvalidInput, NotWorkable } from '../errors/domain-error.ts';
import type { Point } from '../outline/outline.ts';
import type { NestContainer, NestProblem, Ring } from './problem.ts';
import { ringBounds, signedArea } from './ring.ts';
import { crossingOf } from './self-crossing.ts';
import type { Shape } from './shape.ts';

/** So many corners an outline may have; a container and its flaws together so many more. */
const [mostCorners, mostEdgeCorners] = [2000, 20_000];
const largestMm = 20_000;
const mostPieces = 20_000;

/**
 * Refuses what cannot be laid out, naming the place: outlines that are open, cross themselves, have
 * no area or too many corners; lengths that are no numbers or out of range.
 * @throws InvalidInput · NotWorkable beyond 20,000 pieces
 */
export function checkNestProblem(problem: NestProblem): void {
  const { outline, container, holes = [], gap, trim = 0, flawClearance = 0 } = problem;
  checkRing(outline, 'outline', mostCorners);
  checkContainer(container);
  holes.forEach((hole, at) => checkRing(hole, `holes.${at}`, mostEdgeCorners));
  checkLength(gap, 'gap', 0, 100);
  checkLength(trim, 'trim', 0, 100);
  checkLength(flawClearance, 'flawClearance', 0, 100);
  checkRotations(problem);
  const room = containerArea(container);
  if (room / Math.abs(signedArea(outline)) > mostPieces) {
    throw new NotWorkable(
      `More than ${mostPieces} pieces could lie there: work out a smaller panel and take several.`,
    );
  }
}

function checkContainer(container: NestContainer): void {
  switch (container.type) {
    case 'rect':
      checkLength(container.w, 'container.w', 0.001, largestMm);
      return checkLength(container.h, 'container.h', 0.001, largestMm);
    case 'strip': {
      checkLength(container.width, 'container.width', 0.001, largestMm);
      const { qty = 1 } = container;
      if (Number.isInteger(qty) && qty >= 1 && qty <= mostPieces) return;
      throw new InvalidInput('container.qty', `Give the pieces as 1 to ${mostPieces}.`);
    }
    case 'polygon':
      return checkRing(container.points, 'container.points', mostEdgeCorners);
    default:
      throw new InvalidInput('container.type', 'Choose rect, strip or polygon.');
  }
}

function containerArea(container: NestContainer): number {
  if (container.type === 'rect') return container.w * container.h;
  return container.type === 'polygon' ? Math.abs(signedArea(container.points)) : 0;
}

function checkLength(value: number, field: string, least: number, most: number): void {
  if (!(value >= least && value <= most)) {
    throw new InvalidInput(field, `Give ${field} as ${least} to ${most} mm.`);
  }
}

function checkRotations({ rotations }: NestProblem): void {
  if (rotations === 'free') return;
  if (rotations.length < 1 || rotations.length > 36 || !rotations.every(Number.isFinite)) {
    throw new InvalidInput('rotations', 'Give 1 to 36 turns in degrees, or "free".');
  }
}

/** @throws InvalidInput with the corner at fault, counted from 0 */
function checkRing(ring: Ring, field: string, most: number): void {
  if (ring.length < 3) throw new InvalidInput(field, `Give ${field} at least three corners.`);
  if (ring.length > most) {
    throw new InvalidInput(
      field,
      `Give ${field} at most ${most} corners: it has ${ring.length}. Simplify the drawing.`,
    );
  }
  const bad = ring.findIndex(({ x, y }) => !(Math.abs(x) <= largestMm && Math.abs(y) <= largestMm));
  if (bad >= 0) {
    throw new InvalidInput(
      `${field}.${bad}`,
      `Give corner ${bad} of ${field} as two numbers from −${largestMm} to ${largestMm} mm.`,
    );
  }
  checkCourse(ring, field);
}

function checkCourse(ring: Ring, field: string): void {
  const { minX, minY, maxX, maxY } = ringBounds([ring]);
  const box = (maxX - minX) * (maxY - minY);
  const crossing = box > 0 ? crossingOf(ring) : null;
  if (crossing) {
    throw new InvalidInput(
      field,
      `Draw ${field} so that it does not cross itself: near ${placeText(crossing)} mm it does.`,
    );
  }
  if (!(Math.abs(signedArea(ring)) > 1e-9 * Math.max(1, box))) {
    throw new InvalidInput(field, `Draw ${field} around an area: it encloses none.`);
  }
}

const placeText = ({ x, y }: Point): string => `(${x.toFixed(2)}, ${y.toFixed(2)})`;

/** Whether a piece is larger than the container whichever way it is turned. */
export function fitsNowhere({ container, trim = 0 }: NestProblem, { areaMm2 }: Shape): boolean {
  if (container.type === 'strip') return container.width <= 2 * trim;
  if (container.type === 'rect' && Math.min(container.w, container.h) <= 2 * trim) return true;
  return areaMm2 > containerArea(container) * (1 + 1e-9);
}
