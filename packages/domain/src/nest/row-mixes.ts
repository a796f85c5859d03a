import { Surroundings } from './layout-state.ts';
import type { NestPlacement, NestProblem } from './problem.ts';
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
