import type { Bounds, Point } from '../outline/outline.ts';
import { direction, turnedPoint } from './ring.ts';

/** One piece of the repeating cell: its turn against the pattern's first piece, and its place. */
export interface Member {
  turn: 0 | 180;
  at: Point;
}

/** A pattern that repeats after the steps `along` and `across`, in mm. */
export interface Crystal {
  /** from one piece of a row to the next */
  along: Point;
  across: Point;
  members: readonly Member[];
}

/** Area of the plane that each piece takes, in mm². */
export function areaPerPiece({ along, across, members }: Crystal): number {
  return Math.abs(along.x * across.y - along.y * across.x) / members.length;
}

export function turnedCrystal(crystal: Crystal, degrees: number): Crystal {
  const by = direction(degrees);
  return {
    along: turnedPoint(crystal.along, by),
    across: turnedPoint(crystal.across, by),
    members: crystal.members.map(({ turn, at }) => ({ turn, at: turnedPoint(at, by) })),
  };
}

/** Every repeat of a place within a box and a margin around it, with its whole numbers of steps. */
export function* repeatsWithin(crystal: Crystal, at: Point, box: Bounds, margin: number) {
  const { along, across } = crystal;
  const cross = along.x * across.y - along.y * across.x;
  const corners = [box.minX - margin, box.maxX + margin].flatMap((x) =>
    [box.minY - margin, box.maxY + margin].map((y) => ({ x: x - at.x, y: y - at.y })),
  );
  const vs = corners.map(({ x, y }) => (along.x * y - along.y * x) / cross);
  const us = corners.map(({ x, y }) => (x * across.y - y * across.x) / cross);
  const [lowU, highU] = [Math.ceil(Math.min(...us)), Math.floor(Math.max(...us))];
  for (let v = Math.ceil(Math.min(...vs)); v <= Math.max(...vs); v += 1) {
    for (let u = lowU; u <= highU; u += 1) {
      const [x, y] = [at.x + u * along.x + v * across.x, at.y + u * along.y + v * across.y];
      if (x < box.minX - margin || x > box.maxX + margin) continue;
      if (y < box.minY - margin || y > box.maxY + margin) continue;
      yield { u, v, x, y };
    }
  }
}
