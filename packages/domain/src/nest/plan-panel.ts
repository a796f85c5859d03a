import { Candidates } from './candidates.ts';
import { turnedCrystal } from './crystal.ts';
import type { Pattern } from './dense-patterns.ts';
import { fitMore, type Seed } from './fit-more.ts';
import { freeBases } from './free-bases.ts';
import { type RowEffort, rowsFor } from './panel-rows.ts';
import type { NestProblem, Rotations } from './problem.ts';
import { ringBounds, turned } from './ring.ts';
import type { Room } from './room.ts';
import { rowFrame } from './row-frame.ts';
import { type Base, basesOf, type Shape } from './shape.ts';

/** Lines of a dense pattern to look along, besides those through the panel's corners. */
const tries = 12;

/** Rows along a panel's edges and dense patterns at any slant, most pieces first. */
export function panelCandidates(
  problem: NestProblem,
  shape: Shape,
  room: Room,
  patterns: readonly Pattern[],
): Candidates {
  const candidates = new Candidates(room, shape.noFit);
  fitMore(candidates, shape, room, panelPool(candidates, problem, shape, patterns));
  return candidates;
}

/** All patterns that suit a panel, each of them considered. */
export function panelPool(
  candidates: Candidates,
  problem: NestProblem,
  shape: Shape,
  patterns: readonly Pattern[],
): Seed[] {
  const pool: Seed[] = [];
  const consider = (seed: Seed, lines: number) => {
    candidates.consider(seed.crystal, seed.rot, lines);
    pool.push(seed);
  };
  const bases = basesOf(problem.rotations, shape.symmetrical) ?? freeBases(patterns, shape);
  const effort = effortFor(problem.rotations);
  for (const base of bases) {
    for (const axis of [0, 90]) {
      for (const seed of rowSeeds(problem, shape, base, axis, effort)) consider(seed, 0);
    }
  }
  // Free pieces already lie with some pattern's rows along an edge.
  const slanting = problem.rotations === 'free' ? patterns.slice(0, 3) : patterns;
  for (const { rot, halfTurns } of bases) {
    for (const { crystal } of slanting) {
      if (crystal.members.length > 1 && !halfTurns) continue;
      consider({ crystal: turnedCrystal(crystal, rot), rot }, tries);
    }
  }
  return pool;
}

const effortFor = (rotations: Rotations): RowEffort =>
  rotations === 'free' ? { pitches: 8, shifts: 2 } : { pitches: 24, shifts: 4 };

function* rowSeeds(
  { container, trim = 0 }: NestProblem,
  shape: Shape,
  { rot, halfTurns }: Base,
  axis: number,
  effort: RowEffort,
): Generator<Seed> {
  if (container.type !== 'rect') return;
  const noFit = halfTurns ? shape.noFit : { ...shape.noFit, turned: null };
  const box = ringBounds([turned(shape.ring, rot - axis)]);
  const length = (axis === 0 ? container.w : container.h) - 2 * trim - (box.maxX - box.minX);
  if (length < -shape.slack) return;
  const frame = rowFrame(noFit, axis - rot);
  const room = { length: Math.max(0, length), turnedStart: box.minX + box.maxX };
  for (const crystal of rowsFor(frame, room, effort)) {
    yield { crystal: turnedCrystal(crystal, axis), rot };
  }
}
