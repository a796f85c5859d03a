import { type Candidate, Candidates } from './candidates.ts';
import { type Crystal, turnedCrystal } from './crystal.ts';
import type { Pattern } from './dense-patterns.ts';
import { type RowEffort, rowsFor } from './panel-rows.ts';
import type { NestPlacement, NestProblem, Rotations } from './problem.ts';
import { ringBounds, turned } from './ring.ts';
import type { Room } from './room.ts';
import { rowFrame } from './row-frame.ts';
import { type Base, basesOf, type Shape } from './shape.ts';

/** A regular layout that has been looked over. */
export interface RoomPlan {
  placements: NestPlacement[];
  crystal: Crystal;
  rot: number;
}

/** Candidates for a panel or a side, most pieces first. */
export function roomCandidates(
  problem: NestProblem,
  shape: Shape,
  room: Room,
  patterns: readonly Pattern[],
): Candidates {
  const candidates = new Candidates(room, 12);
  const { container } = problem;
  const bases = basesOf(problem.rotations, shape.symmetrical) ?? freeBases(patterns, container.type);
  if (container.type === 'rect') {
    const effort = effortFor(problem.rotations);
    for (const base of bases) {
      for (const axis of [0, 90]) considerRows(candidates, problem, shape, base, axis, effort);
    }
  }
  const tries = container.type === 'rect' ? 16 : 40;
  for (const { rot, halfTurns } of bases) {
    for (const { crystal } of patterns) {
      if (crystal.members.length > 1 && !halfTurns) continue;
      candidates.consider(turnedCrystal(crystal, rot), rot, tries);
    }
  }
  return candidates;
}

const effortFor = (rotations: Rotations): RowEffort =>
  rotations === 'free' ? { pitches: 10, shifts: 2 } : { pitches: 24, shifts: 4 };

function considerRows(
  candidates: Candidates,
  { container, trim = 0 }: NestProblem,
  shape: Shape,
  { rot, halfTurns }: Base,
  axis: number,
  effort: RowEffort,
): void {
  if (container.type !== 'rect') return;
  const noFit = halfTurns ? shape.noFit : { ...shape.noFit, turned: null };
  const box = ringBounds([turned(shape.ring, rot - axis)]);
  const length = (axis === 0 ? container.w : container.h) - 2 * trim - (box.maxX - box.minX);
  if (length < 0) return;
  const frame = rowFrame(noFit, axis - rot);
  for (const crystal of rowsFor(frame, { length, turnedStart: box.minX + box.maxX }, effort)) {
    candidates.consider(turnedCrystal(crystal, axis), rot, 0);
  }
}

/** For pieces that may lie at any angle: such that a dense pattern's rows run along the edges. */
function freeBases(patterns: readonly Pattern[], container: string): Base[] {
  if (container !== 'rect') {
    return Array.from({ length: 24 }, (_, at) => ({ rot: (at * 180) / 24, halfTurns: true }));
  }
  const bases: Base[] = [];
  for (const { crystal } of patterns.slice(0, 4)) {
    const { along, across } = crystal;
    const steps = [along, across, { x: along.x + across.x, y: along.y + across.y }];
    for (const { x, y } of steps) {
      const angle = (Math.atan2(y, x) * 180) / Math.PI;
      for (const axis of [0, 90]) bases.push({ rot: axis - angle, halfTurns: true });
    }
  }
  return bases;
}

export type { Candidate };
