import type { Point } from '../outline/outline.ts';
import type { NestPlacement, NestProblem } from './problem.ts';
import { direction, ringBounds, turnedPoint } from './ring.ts';

/** A problem whose outline lies around the origin, and the way back to the outline as given. */
export interface Centred {
  problem: NestProblem;
  /** a place of the centred outline as one of the outline as given */
  asGiven: (placement: NestPlacement) => NestPlacement;
  /** the other way round */
  asCentred: (placement: NestPlacement) => NestPlacement;
}

/** Distances between pieces stay small, and rounding with them, wherever the outline was drawn. */
export function centred(problem: NestProblem): Centred {
  const { minX, minY, maxX, maxY } = ringBounds([problem.outline]);
  const middle: Point = { x: (minX + maxX) / 2, y: (minY + maxY) / 2 };
  const outline = problem.outline.map(({ x, y }) => ({ x: x - middle.x, y: y - middle.y }));
  const moved = (sign: number) => (placement: NestPlacement) => {
    const offset = turnedPoint(middle, direction(placement.rot));
    return {
      x: placement.x + sign * offset.x,
      y: placement.y + sign * offset.y,
      rot: placement.rot,
    };
  };
  return { problem: { ...problem, outline }, asGiven: moved(-1), asCentred: moved(1) };
}
