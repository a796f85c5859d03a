import { areaPerPiece, type Crystal } from './crystal.ts';
import { type Clearances, crystalWishes, movedCrystal, unknownsOf } from './crystal-wishes.ts';
import { linearStep } from './linear-step.ts';

const mostRounds = 60;

/**
 * Moves a pattern's repeats and its pieces so that the area per piece falls, by linear programmes
 * in which every neighbour stays within a convex free cell: each step can be cut.
 * @param pull what else is to be lessened: mm² per mm of the steps along x, y and across x, y
 * @param precision in shares of a piece's size
 */
export function tightened(
  crystal: Crystal,
  clear: Clearances,
  pull: readonly number[] = [0, 0, 0, 0],
  precision = 1e-8,
): Crystal {
  const worth = (other: Crystal) =>
    areaPerPiece(other) * other.members.length + pulled(other, pull);
  let best = crystal;
  const { bounds } = clear.same;
  const size = Math.hypot(bounds.maxX, bounds.maxY);
  let reach = size / 12;
  for (let round = 0; round < mostRounds && reach > size * precision; round += 1) {
    const next = oneStep(best, clear, reach, pull);
    const gain = next ? worth(best) - worth(next) : 0;
    if (next && gain > 0) best = next;
    if (gain < areaPerPiece(best) * 1e-4) reach /= 4;
  }
  return best;
}

const pulled = ({ along, across }: Crystal, pull: readonly number[]): number =>
  [along.x, along.y, across.x, across.y].reduce((sum, at, i) => sum + at * (pull[i] ?? 0), 0);

function oneStep(
  crystal: Crystal,
  clear: Clearances,
  reach: number,
  pull: readonly number[],
): Crystal | null {
  const { along: a, across: b } = crystal;
  const size = unknownsOf(crystal);
  const sign = a.x * b.y - a.y * b.x < 0 ? -1 : 1;
  const cost = new Array<number>(size).fill(0);
  [b.y, -b.x, -a.y, a.x].forEach((gradient, at) => {
    cost[at] = sign * gradient + (pull[at] ?? 0);
  });
  const step = linearStep(cost, crystalWishes(crystal, clear, reach, size), reach);
  return step && movedCrystal(crystal, step);
}
