import { fullTurn } from './candidates.ts';
import type { Pattern } from './dense-patterns.ts';
import { nestFaults } from './nest-faults.ts';
import type { NestPlacement, NestProblem } from './problem.ts';
import { ringBounds, turned } from './ring.ts';
import { rowFrame } from './row-frame.ts';
import { type Base, basesOf, type Shape } from './shape.ts';
import {
  cellConflict,
  type StripCell,
  shortened,
  stripEdges,
  type StripRules,
} from './strip-cell.ts';
import { rowsAcross, rowsAlong } from './strip-seeds.ts';
import { unitsAlong } from './strip-units.ts';
import { freeBases } from './free-bases.ts';

/** How many of the most promising patterns are shortened. */
const mostShortened = 6;

/** The pattern that takes the least strip per piece; null where no piece fits across the strip. */
export function bestStripCell(
  problem: NestProblem,
  shape: Shape,
  patterns: readonly Pattern[],
): StripCell | null {
  const bases = basesOf(problem.rotations, shape.symmetrical) ?? freeBases(patterns, shape);
  const seeds = bases.flatMap((base) => {
    const rules = rulesFor(problem, shape, base);
    return rules ? seedsFor(shape, base, rules).map((cell) => ({ cell, rules })) : [];
  });
  seeds.sort((a, b) => perPiece(a.cell) - perPiece(b.cell));
  const shorter = [...distinct(seeds), ...distinct(seeds).slice(0, 2).flatMap(doubled)]
    .map(({ cell, rules }) => shortened(cell, rules))
    .sort((a, b) => perPiece(a) - perPiece(b));
  return (
    shorter.find((cell) => isSound(problem, cell)) ??
    seeds.find(({ cell }) => isSound(problem, cell))?.cell ??
    null
  );
}

const perPiece = ({ periodMm, pieces }: StripCell): number => periodMm / pieces.length;

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

interface Seed {
  cell: StripCell;
  rules: StripRules;
}

/** The best seeds of different kinds: numbers of pieces, or lengths that differ clearly. */
function distinct(seeds: readonly Seed[]): Seed[] {
  const chosen: Seed[] = [];
  for (const seed of seeds) {
    if (chosen.length === mostShortened) break;
    if (seed.cell.pieces.length > 30) continue;
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

const lifts = [0.03, 0.1];
const stretches = [1, 1.02, 1.05, 1.1, 1.15];

/**
 * Two repeats, the second farther up the strip: then a piece need not lie straight behind another.
 * Lengthened until it can be cut.
 */
function doubled({ cell: { periodMm, pieces }, rules }: Seed): Seed[] {
  if (pieces.length > 8) return [];
  const { minY, maxY } = rules.same.bounds;
  return lifts.flatMap((share) => {
    const raised = pieces.map(({ x, y, rot }) => {
      const [least, most] = rot === rules.rot ? rules.upright : rules.halfTurned;
      const lift = (share * (maxY - minY)) / 2;
      return {
        low: { x, y: Math.max(least, y - lift), rot },
        high: { x, y: Math.min(most, y + lift), rot },
      };
    });
    for (const stretch of stretches) {
      const apart = periodMm * stretch;
      const second = raised.map(({ high }) => ({ ...high, x: high.x + apart }));
      const cell = { periodMm: 2 * apart, pieces: [...raised.map(({ low }) => low), ...second] };
      if (cellConflict(cell, rules) < 1e-6) return [{ rules, cell }];
    }
    return [];
  });
}

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
