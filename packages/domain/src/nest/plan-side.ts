import { Candidates } from './candidates.ts';
import { areaPerPiece, type Crystal, turnedCrystal } from './crystal.ts';
import { clearances } from './crystal-wishes.ts';
import type { Pattern } from './dense-patterns.ts';
import { rotationPeriod } from './free-bases.ts';
import type { NestProblem } from './problem.ts';
import type { Room } from './room.ts';
import { seeded } from './seeded.ts';
import { type Base, basesOf, type Shape } from './shape.ts';
import { tightened } from './tighten.ts';

/** Lines of a pattern to look along at first, and for what has given most. */
const [firstTries, lastTries] = [24, 240];
const variations = 80;
/** Angles tried where any is allowed; more where only a few pieces lie. */
const [angles, manyAngles, fewPieces] = [8, 32, 20];
/** How strongly variations are pulled away from the densest, in shares of a piece's size. */
const pulls = [0.03, 0.1, 0.2];

/** Dense patterns over a side or hide, and variations of them, most pieces first. */
export function sideCandidates(
  { rotations }: NestProblem,
  shape: Shape,
  room: Room,
  patterns: readonly Pattern[],
): Candidates {
  const candidates = new Candidates(room, shape.noFit);
  const bases = basesOf(rotations, shape.symmetrical) ?? anyAngle(shape, room);
  const consider = (crystal: Crystal, { rot, halfTurns }: Base) => {
    if (crystal.members.length > 1 && !halfTurns) return;
    candidates.consider(turnedCrystal(crystal, rot), rot, firstTries);
  };
  const looked = rotations === 'free' && bases.length <= angles ? patterns.slice(0, 4) : patterns;
  for (const base of bases) for (const { crystal } of looked) consider(crystal, base);
  const perBase = Math.ceil(variations / bases.length);
  for (const base of bases) {
    const allowed = patterns.filter(
      ({ crystal }) => base.halfTurns || crystal.members.length === 1,
    );
    for (const crystal of varied(shape, allowed, perBase)) consider(crystal, base);
  }
  for (const { crystal, rot } of candidates.kept.slice(0, 2)) {
    candidates.consider(crystal, rot, lastTries);
  }
  return candidates;
}

/** Angles spread over those that differ for this outline. */
function anyAngle(shape: Shape, room: Room): Base[] {
  const period = rotationPeriod(shape);
  const most = room.areaMm2 < fewPieces * shape.areaMm2 ? manyAngles : angles;
  return Array.from({ length: most }, (_, at) => ({
    rot: (at * period) / most,
    halfTurns: !shape.symmetrical,
  }));
}

/** Other patterns all but as dense: the shape of the side decides which of them gives most. */
function varied(shape: Shape, patterns: readonly Pattern[], count: number): Crystal[] {
  const clear = clearances(shape.noFit);
  const chance = seeded(3);
  const dense = patterns.filter(({ areaMm2 }) => areaMm2 < 1.04 * (patterns[0]?.areaMm2 ?? 0));
  if (dense.length === 0) return [];
  return Array.from({ length: count }, (_, at) => {
    // The densest first and most often.
    const { crystal } = dense[Math.floor(chance() ** 2 * Math.min(6, dense.length))] as Pattern;
    const strength = (pulls[at % pulls.length] as number) * Math.sqrt(areaPerPiece(crystal));
    const pull = [0, 1, 2, 3].map(() => (2 * chance() - 1) * strength);
    return tightened(crystal, clear, pull, 1e-5);
  });
}
