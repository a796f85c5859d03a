import { Surroundings } from './layout-state.ts';
import { fullTurn } from './candidates.ts';
import type { NestPlacement, NestProblem, RowNumbers } from './problem.ts';
import { turned } from './ring.ts';
import { Room } from './room.ts';
import { rowSequences } from './row-sequence.ts';
import type { Shape } from './shape.ts';
import { shapeOf } from './shape.ts';

/** Layouts of a panel in rows of different kinds, along it and up it. */
export function rowMixes(
  problem: NestProblem,
  shape: Shape,
  around: Surroundings,
  rots: readonly number[],
): NestPlacement[][] {
  const { container } = problem;
  if (container.type !== 'rect') return [];
  const lying = rowSequences(around, rots);
  // Rows up the panel are rows along it when everything is turned clockwise by a quarter.
  const outline = turned(shape.ring, -90);
  const onItsSide: NestProblem = {
    ...problem,
    outline,
    container: { type: 'rect', w: container.h, h: container.w },
  };
  const turnedShape = shapeOf(outline, problem.gap);
  const beside = new Surroundings(new Room(onItsSide, turnedShape), turnedShape, problem.gap);
  const standing = rowSequences(beside, rots).map((layout) =>
    layout.map(({ x, y, rot }) => ({ x: container.w - y, y: x, rot })),
  );
  return [...lying, ...standing];
}

/** The turns worth mixing: of an outline that half a turn does not change, one of each pair. */
export function turnsToMix(rotations: readonly number[], { symmetrical }: Shape): number[] {
  const turns = [...new Set(rotations.map(fullTurn))];
  const alike = (a: number, b: number) => Math.abs((a - b) % 180) < 1e-6;
  return turns
    .filter((rot, at) => !symmetrical || turns.findIndex((other) => alike(other, rot)) === at)
    .slice(0, 8);
}

/** The numbers of rows that differ: the first row's pitch, and steps and turns as they come. */
export function mixNumbers(layout: readonly NestPlacement[]): RowNumbers {
  const [first, second] = layout;
  const across = first && second && Math.abs(first.x - second.x) < Math.abs(first.y - second.y);
  const along = (piece: NestPlacement) => (across ? piece.y : piece.x);
  const height = (piece: NestPlacement) => (across ? piece.x : piece.y);
  const starts = layout.filter(
    (piece, at) => at === 0 || Math.abs(height(piece) - height(layout[at - 1] ?? piece)) > 1e-9,
  );
  const [low, next] = starts;
  return {
    pitchMm: first && second ? Math.abs(along(second) - along(first)) : 0,
    rowStepMm: low && next ? Math.abs(height(next) - height(low)) : 0,
    shiftMm: low && next ? along(next) - along(low) : 0,
    directionDeg: across ? 90 : 0,
    rowTurns: starts.map(({ rot }) => rot),
  };
}
