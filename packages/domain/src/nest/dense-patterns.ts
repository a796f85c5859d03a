import { deepestConflict } from './crystal-faults.ts';
import { areaPerPiece, type Crystal, turnedCrystal } from './crystal.ts';
import { type NoFitPair, rowFrame } from './row-frame.ts';
import {
  alternatingRows,
  alternatingShifts,
  driftingRows,
  driftShifts,
  rowCurves,
} from './row-patterns.ts';
import { clearances } from './crystal-wishes.ts';
import { tightened } from './tighten.ts';
import type { Ring } from './problem.ts';
import { thinnedAround } from './thinned.ts';

/** A pattern that lies as the upright outline does, and the area of the plane per piece, in mm². */
export interface Pattern {
  crystal: Crystal;
  areaMm2: number;
}

const directions = 60;
/** Patterns whose pieces reach deeper into each other, in mm, are left out. */
const soundMm = 1e-5;
/** The same for a first look, in shares of a piece's size. */
const roughShare = 0.01;

/**
 * Patterns of little area per piece, densest first: straight and alternating rows in some 60
 * directions, of which the most promising are tightened, first against a simpler outline.
 */
export function densePatterns(
  noFit: NoFitPair,
  effort: { seeds: number; kept: number },
): Pattern[] {
  const coarse: NoFitPair = {
    same: noFit.same.map(coarser),
    turned: noFit.turned && noFit.turned.map(coarser),
  };
  const seeds = Array.from({ length: directions }, (_, at) =>
    patternsAt(coarse, (180 * at) / directions),
  ).flat();
  const [roughly, exactly] = [clearances(coarse), clearances(noFit)];
  const rough = distinct(seeds.sort(byArea), effort.seeds, 1e-4)
    .map(({ crystal }) => patternOf(tightened(crystal, roughly)))
    .filter(({ crystal, areaMm2 }) => {
      return deepestConflict(crystal, coarse) < roughShare * Math.sqrt(areaMm2);
    });
  return distinct(rough.sort(byArea), effort.kept, 1e-5)
    .map(({ crystal }) => patternOf(tightened(crystal, exactly)))
    .filter(({ crystal }) => deepestConflict(crystal, noFit) < soundMm)
    .sort(byArea);
}

const byArea = (a: Pattern, b: Pattern): number => a.areaMm2 - b.areaMm2;

const patternOf = (crystal: Crystal): Pattern => ({ crystal, areaMm2: areaPerPiece(crystal) });

const coarser = (ring: Ring): Ring => thinnedAround(ring, 48);

/** The best straight and the best alternating rows in a direction of the outline's own. */
function patternsAt(noFit: NoFitPair, directionDeg: number): Pattern[] {
  const frame = rowFrame(noFit, directionDeg);
  const curves = rowCurves(frame, frame.leastPitch);
  const straight = driftShifts(curves, 3).map((shift) => driftingRows(curves, shift));
  const alternating = alternatingShifts(curves, 3).map(([up, down]) =>
    alternatingRows(curves, up, down),
  );
  return [straight, alternating].flatMap((crystals) => {
    const best = leastArea(crystals);
    return best ? [patternOf(turnedCrystal(best, directionDeg))] : [];
  });
}

function leastArea(crystals: readonly (Crystal | null)[]): Crystal | null {
  let [best, least] = [null as Crystal | null, Infinity];
  for (const crystal of crystals) {
    const area = crystal ? areaPerPiece(crystal) : Infinity;
    if (area < least) [best, least] = [crystal, area];
  }
  return best;
}

/** Seeds that differ in more than their last digits: the same pattern is found many times over. */
function distinct(seeds: readonly Pattern[], most: number, apart: number): Pattern[] {
  const chosen: Pattern[] = [];
  for (const seed of seeds) {
    if (chosen.length === most) break;
    const alike = chosen.some(
      ({ areaMm2, crystal }) =>
        Math.abs(areaMm2 - seed.areaMm2) < apart * areaMm2 &&
        crystal.members.length === seed.crystal.members.length,
    );
    if (!alike) chosen.push(seed);
  }
  return chosen;
}
