import type { NestPlacement } from './problem.ts';
import { seeded } from './seeded.ts';
import { type StripCell, shortened, type StripRules } from './strip-cell.ts';
import { partedCell } from './strip-part.ts';

/** A repeat and the rules of its strip. */
export interface StripSeed {
  cell: StripCell;
  rules: StripRules;
}

export const perPiece = ({ periodMm, pieces }: StripCell): number => periodMm / pieces.length;

const tries = 26;
const [mostKinds, mostPieces] = [3, 5];
/** How much shorter than the best a try begins. */
const shorter = 0.995;

/**
 * Two repeats of promising kinds, shaken, pressed into less length than the best takes and parted
 * again: then pieces need not lie straight behind each other.
 */
export function squeezedCells(seeds: readonly StripSeed[], best: number): StripCell[] {
  const kinds = kindsOf(seeds, best);
  if (kinds.length === 0) return [];
  const chance = seeded(3);
  const found: StripCell[] = [];
  let least = best;
  for (let turn = 0; turn < tries; turn += 1) {
    // Every third try is for a kind that is less likely to give way.
    const kind = turn % 3 === 2 ? turn % kinds.length : turn % Math.min(2, kinds.length);
    const { cell, rules } = kinds[kind] as StripSeed;
    const periodMm = least * shorter * 2 * cell.pieces.length;
    const apart = partedCell({ periodMm, pieces: shaken(cell, rules, periodMm, chance) }, rules);
    if (!apart) continue;
    const next = shortened(apart, rules);
    found.push(next);
    least = Math.min(least, perPiece(next));
  }
  return found;
}

/** The best seed of every order of turns, the most promising first. */
function kindsOf(seeds: readonly StripSeed[], best: number): StripSeed[] {
  const kinds = new Map<string, StripSeed>();
  for (const seed of seeds) {
    if (seed.cell.pieces.length > mostPieces || perPiece(seed.cell) > 1.12 * best) continue;
    const kind = seed.cell.pieces.map(({ rot }) => rot).join(' ');
    if (!kinds.has(kind)) kinds.set(kind, seed);
  }
  const mixed = ({ cell }: StripSeed) =>
    new Set(cell.pieces.map(({ rot }) => rot)).size > 1 ? 0 : 1;
  return [...kinds.values()].slice(0, mostKinds).sort((a, b) => mixed(a) - mixed(b));
}

function shaken(
  { pieces }: StripCell,
  rules: StripRules,
  periodMm: number,
  chance: () => number,
): NestPlacement[] {
  const strength = (0.02 + 0.08 * chance()) * rules.same.bounds.maxX;
  const jolt = () => (2 * chance() - 1) * strength;
  return [0, 0.5].flatMap((share) =>
    pieces.map(({ x, y, rot }) => {
      const [least, most] = rot === rules.rot ? rules.upright : rules.halfTurned;
      const shift = x + share * periodMm + jolt();
      return { x: shift, y: Math.min(most, Math.max(least, y + jolt())), rot };
    }),
  );
}
