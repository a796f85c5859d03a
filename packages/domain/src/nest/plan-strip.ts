import { fullTurn } from './candidates.ts';
import type { Pattern } from './dense-patterns.ts';
import { nestFaults } from './nest-faults.ts';
import type { NestPlacement, NestProblem, RowNumbers } from './problem.ts';
import { ringBounds, turned } from './ring.ts';
import { rowFrame } from './row-frame.ts';
import { type Base, basesOf, type Shape } from './shape.ts';
import { type StripCell, shortened, stripEdges, type StripRules } from './strip-cell.ts';
import { rowsAcross, rowsAlong } from './strip-seeds.ts';
import { perPiece, squeezedCells, type StripSeed } from './strip-squeeze.ts';
import { unitsAlong } from './strip-units.ts';
import { freeBases } from './free-bases.ts';

/** How many of the most promising patterns are shortened. */
const mostShortened = 5;
/** Repeats of more pieces are left as they are, and of long ones only the two best are shortened. */
const [mostPieces, manyPieces] = [30, 12];

const isLong = ({ cell }: StripSeed): boolean => cell.pieces.length > manyPieces;

/** The pattern that takes the least strip per piece; null where no piece fits across the strip. */
export function bestStripCell(
  problem: NestProblem,
  shape: Shape,
  patterns: readonly Pattern[],
): StripCell | null {
  const bases = basesOf(problem.rotations, shape.symmetrical) ?? freeBases(patterns, shape);
  const seeds = stripSeeds(problem, shape, bases);
  seeds.sort((a, b) => perPiece(a.cell) - perPiece(b.cell));
  const shorter = distinct(seeds).map(({ cell, rules }) => shortened(cell, rules));
  const best = Math.min(Infinity, ...shorter.map(perPiece));
  const cells = [...shorter, ...squeezedCells(seeds, best), ...seeds.map(({ cell }) => cell)];
  cells.sort((a, b) => perPiece(a) - perPiece(b));
  return cells.find((cell) => isSound(problem, cell)) ?? null;
}

/** Rows along and across a strip, of pieces that lie in one of the ways given. */
export function stripSeeds(
  problem: NestProblem,
  shape: Shape,
  bases: readonly Base[],
): StripSeed[] {
  return bases.flatMap((base) => {
    const rules = rulesFor(problem, shape, base);
    return rules ? seedsFor(shape, base, rules).map((cell) => ({ cell, rules })) : [];
  });
}

function rulesFor(problem: NestProblem, shape: Shape, { rot, halfTurns }: Base): StripRules | null {
  const { container, trim = 0 } = problem;
  if (container.type !== 'strip') return null;
  const box = ringBounds([turned(shape.ring, rot)]);
  const [least, most] = [trim - box.minY, container.width - trim - box.maxY];
  if (most < least - shape.slack) return null;
  const upright = [least - shape.slack, Math.max(least, most) + shape.slack] as const;
  const mirrored = [
    trim + box.maxY - shape.slack,
    container.width - trim + box.minY + shape.slack,
  ] as const;
  const noFit = halfTurns ? shape.noFit : { ...shape.noFit, turned: null };
  return { rot: fullTurn(rot), upright, halfTurned: mirrored, ...stripEdges(noFit, rot) };
}

function seedsFor(shape: Shape, { rot, halfTurns }: Base, rules: StripRules): StripCell[] {
  const noFit = halfTurns ? shape.noFit : { ...shape.noFit, turned: null };
  return [
    ...rowsAlong(rowFrame(noFit, -rot), rules),
    ...unitsAlong(rowFrame(noFit, -rot), rules),
    ...rowsAcross(rowFrame(noFit, 90 - rot), rules),
  ].filter(({ periodMm, pieces }) => pieces.length > 0 && periodMm > 1e-6);
}

/** The best seeds of different kinds: numbers of pieces, or lengths that differ clearly. */
function distinct(seeds: readonly StripSeed[]): StripSeed[] {
  const chosen: StripSeed[] = [];
  for (const seed of seeds) {
    if (chosen.length === mostShortened) break;
    if (seed.cell.pieces.length > mostPieces) continue;
    if (isLong(seed) && chosen.filter(isLong).length === 2) continue;
    const alike = chosen.some(
      ({ cell, rules }) =>
        rules.rot === seed.rules.rot &&
        cell.pieces.length === seed.cell.pieces.length &&
        halfTurnedIn(cell, rules) === halfTurnedIn(seed.cell, rules) &&
        Math.abs(cell.periodMm - seed.cell.periodMm) < 0.01 * cell.periodMm,
    );
    if (!alike) chosen.push(seed);
  }
  return chosen;
}

const halfTurnedIn = ({ pieces }: StripCell, { rot }: StripRules): number =>
  pieces.filter((piece) => piece.rot !== rot).length;

function isSound(problem: NestProblem, cell: StripCell): boolean {
  return nestFaults(problem, repeated(cell, problem, 3 * cell.pieces.length)).length === 0;
}

/** At least so many pieces in whole repeats, the first of which touches the strip's end. */
export function repeated(cell: StripCell, problem: NestProblem, pieces: number): NestPlacement[] {
  const { trim = 0, outline } = problem;
  const inOrder = startingAtEnd(cell, outline);
  const repeats = Math.ceil(pieces / cell.pieces.length);
  return Array.from({ length: repeats }, (_, repeat) =>
    inOrder.map(({ x, y, rot }) => ({ x: x + trim + repeat * cell.periodMm, y, rot })),
  ).flat();
}

/** Every piece in the repeat in which it first lies wholly past 0. */
function startingAtEnd(
  { periodMm, pieces }: StripCell,
  outline: NestProblem['outline'],
): NestPlacement[] {
  const lefts = pieces.map(({ x, rot }) => x + ringBounds([turned(outline, rot)]).minX);
  const shortest = lefts.map((origin) => {
    const moved = pieces.map(({ x, y, rot }, at) => {
      const left = lefts[at] as number;
      const back = Math.floor((left - origin + 1e-9) / periodMm) * periodMm;
      return { x: x - origin - back, y, rot };
    });
    return { moved, reach: Math.max(...moved.map(({ x }) => x)) };
  });
  const best = shortest.reduce((a, b) => (b.reach < a.reach ? b : a));
  return best.moved.sort((a, b) => a.x - b.x || a.y - b.y);
}

/** The numbers of a strip's rows, of which the first piece begins the repeat. */
export function stripRows({ periodMm, pieces }: StripCell): RowNumbers {
  const [first, second] = pieces;
  return {
    pitchMm: periodMm,
    rowStepMm: first && second ? Math.abs(second.y - first.y) : 0,
    shiftMm: first && second ? second.x - first.x : 0,
    directionDeg: 0,
    rowTurns: pieces.map(({ rot }) => rot),
  };
}
