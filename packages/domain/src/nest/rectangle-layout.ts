import type { NestPlacement, NestProblem, Ring } from './problem.ts';
import { packRectangles } from './rectangles.ts';
import { ringBounds, turned } from './ring.ts';

/**
 * Equal rectangles in a rectangle, where quarter turns are allowed: as many as the search through
 * cuts finds, which is the most wherever its bound is reached. Null for every other problem.
 */
export function rectangleLayout(problem: NestProblem): NestPlacement[] | null {
  const { container, outline, gap, trim = 0, holes = [] } = problem;
  if (container.type !== 'rect' || holes.length > 0 || !isUprightRectangle(outline)) return null;
  const turns = quarterTurns(problem);
  if (!turns) return null;
  const room = { width: container.w - 2 * trim, height: container.h - 2 * trim };
  if (Math.min(room.width, room.height) <= 0) return null;
  const { minX, minY, maxX, maxY } = ringBounds([outline]);
  const { pieces } = packRectangles(room, { width: maxX - minX, height: maxY - minY }, { gap });
  return pieces.map(({ x, y, turned: lies }) => {
    const rot = lies ? turns.lying : turns.upright;
    const corner = ringBounds([turned(outline, rot)]);
    return { x: x + trim - corner.minX, y: y + trim - corner.minY, rot };
  });
}

/** A turn that leaves the rectangle as it is, and one by a quarter; null unless both are allowed. */
function quarterTurns({ rotations }: NestProblem): { upright: number; lying: number } | null {
  if (rotations === 'free') return { upright: 0, lying: 90 };
  const upright = rotations.find((rot) => rot % 180 === 0);
  const lying = rotations.find((rot) => Math.abs(rot % 180) === 90);
  return upright === undefined || lying === undefined ? null : { upright, lying };
}

/** Four corners, every side along x or y. */
function isUprightRectangle(outline: Ring): boolean {
  const { minX, minY, maxX, maxY } = ringBounds([outline]);
  const isCorner = ({ x, y }: { x: number; y: number }) =>
    (x === minX || x === maxX) && (y === minY || y === maxY);
  return outline.length === 4 && outline.every(isCorner);
}
