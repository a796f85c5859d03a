import type { HalfPlane } from './free-cell.ts';
import { type AtLeast, linearStep } from './linear-step.ts';
import { between, cellConflict, type StripCell, type StripRules } from './strip-cell.ts';

const mostRounds = 25;
const clearMm = 1e-7;

/**
 * Moves the pieces of a repeat that reach into each other apart, its length kept, by linear
 * programmes that lessen the deepest conflict. Null where they cannot be parted.
 */
export function partedCell(cell: StripCell, rules: StripRules): StripCell | null {
  let [best, worst] = [cell, cellConflict(cell, rules)];
  let reach = rules.same.bounds.maxX / 6;
  for (let round = 0; round < mostRounds && worst > clearMm; round += 1) {
    const next = oneStep(best, rules, reach, worst);
    const left = next ? cellConflict(next, rules) : Infinity;
    if (next && left < worst) {
      if (left > clearMm && round > 3 && left > 0.85 * worst) return null;
      [best, worst] = [next, left];
    } else reach /= 3;
  }
  return worst <= clearMm ? best : null;
}

/** Unknowns: x and y of every piece, then how deep conflicts may be. */
function oneStep(cell: StripCell, rules: StripRules, reach: number, worst: number) {
  const size = 2 * cell.pieces.length + 1;
  const cost = new Array<number>(size).fill(0);
  cost[size - 1] = 1;
  const wishes = [...edgeWishes(cell, rules, size), ...pairWishes(cell, rules, reach, worst)];
  const step = linearStep(cost, wishes, reach);
  if (!step) return null;
  const pieces = cell.pieces.map(({ x, y, rot }, at) => ({
    x: x + (step[2 * at] ?? 0),
    y: y + (step[2 * at + 1] ?? 0),
    rot,
  }));
  return { ...cell, pieces };
}

function edgeWishes({ pieces }: StripCell, rules: StripRules, size: number): AtLeast[] {
  return pieces.flatMap(({ y, rot }, at) => {
    const [least, most] = rot === rules.rot ? rules.upright : rules.halfTurned;
    return [1, -1].map((side) => {
      const by = new Array<number>(size).fill(0);
      by[2 * at + 1] = side;
      return { by, least: side > 0 ? least - y : y - most };
    });
  });
}

function pairWishes(cell: StripCell, rules: StripRules, reach: number, worst: number): AtLeast[] {
  const { periodMm, pieces } = cell;
  const size = 2 * pieces.length + 1;
  const wishes: AtLeast[] = [];
  for (const [i, first] of pieces.entries()) {
    for (const [j, second] of pieces.entries()) {
      if (j <= i) continue;
      const { edges, sign } = between(first, second, rules);
      if (!edges) continue;
      const { minX, maxX, minY, maxY } = edges.bounds;
      const near = 3 * reach;
      const [dx, y] = [sign * (second.x - first.x), sign * (second.y - first.y)];
      if (y < minY - near || y > maxY + near) continue;
      for (
        let k = Math.ceil((minX - near - dx) / periodMm);
        dx + k * periodMm < maxX + near;
        k += 1
      ) {
        const x = dx + k * periodMm;
        const planes = edges.isInside(x, y) ? [edges.wayOut(x, y)] : edges.freeCell(x, y, near);
        for (const plane of planes) wishes.push(wishOf(plane, { x, y, sign, i, j, size, worst }));
      }
    }
  }
  return wishes;
}

interface Meeting {
  x: number;
  y: number;
  sign: number;
  i: number;
  j: number;
  size: number;
  worst: number;
}

function wishOf({ nx, ny, d }: HalfPlane, { x, y, sign, i, j, size, worst }: Meeting): AtLeast {
  const by = new Array<number>(size).fill(0);
  [by[2 * i], by[2 * i + 1]] = [-sign * nx, -sign * ny];
  [by[2 * j], by[2 * j + 1]] = [sign * nx, sign * ny];
  by[size - 1] = 1;
  return { by, least: d - nx * x - ny * y - worst };
}
