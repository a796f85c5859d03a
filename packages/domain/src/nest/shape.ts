import { grown } from '../outline/clip.ts';
import { blunted } from './blunted.ts';
import { minkowskiSum } from './convolution.ts';
import type { Ring, Rotations } from './problem.ts';
import { cornerAt, counterClockwise, inset, mirroredThroughOrigin, signedArea } from './ring.ts';
import type { NoFitPair } from './row-frame.ts';

/** A piece as the engine sees it, worked out once per problem. */
export interface Shape {
  /** counter-clockwise, as given otherwise */
  ring: Ring;
  /** the ring drawn in by `slack`, so that what fits exactly has room */
  drawnIn: Ring;
  areaMm2: number;
  /** so many mm pieces may reach into each other or over an edge, far below what a check sees */
  slack: number;
  /** looks the same after half a turn */
  symmetrical: boolean;
  noFit: NoFitPair;
}

/** What a spacing may fall short by, in mm: a hundredth of what a check allows. */
const gapShortfall = 1e-5;

/** The spacing to work with. */
export const gapFor = (gap: number): number => Math.max(0, gap - gapShortfall);

/** How far no-fit polygons may go beyond what is needed, in shares of a piece's size. */
const bluntness = 1e-5;

export function shapeOf(outline: Ring, gap: number): Shape {
  const ring = counterClockwise(outline);
  const areaMm2 = signedArea(ring);
  const slack = Math.max(2e-8 * Math.sqrt(areaMm2), 2e-7);
  const drawnIn = inset(ring, slack);
  const first = gap > 0 ? ring : drawnIn;
  const spaced = (other: Ring) =>
    grown(minkowskiSum(first, other), gapFor(gap)).map((part) =>
      blunted(part, bluntness * Math.sqrt(areaMm2)),
    );
  const symmetrical = isSymmetrical(ring);
  const same = spaced(mirroredThroughOrigin(ring));
  return {
    ring,
    drawnIn,
    areaMm2,
    slack,
    symmetrical,
    noFit: { same, turned: symmetrical ? null : spaced(ring) },
  };
}

/** Whether every corner has another opposite to it through the middle of the corners. */
function isSymmetrical(ring: Ring): boolean {
  if (ring.length % 2 === 1) return false;
  const half = ring.length / 2;
  const sumAt = (at: number) => {
    const [a, b] = [cornerAt(ring, at), cornerAt(ring, at + half)];
    return { x: a.x + b.x, y: a.y + b.y };
  };
  const first = sumAt(0);
  return ring.every((_, at) => {
    const sum = sumAt(at);
    return Math.abs(sum.x - first.x) < 1e-9 && Math.abs(sum.y - first.y) < 1e-9;
  });
}

/** An orientation of the pattern's upright pieces, and whether others may be half turned. */
export interface Base {
  rot: number;
  halfTurns: boolean;
}

/** The orientations to try of what is allowed; null where any angle is. */
export function basesOf(rotations: Rotations, symmetrical: boolean): Base[] | null {
  if (rotations === 'free') return null;
  const turns = [...new Set(rotations.map((rot) => ((rot % 360) + 360) % 360))];
  const opposite = (rot: number) => turns.some((other) => sameAngle(other, rot + 180));
  return turns
    .filter((rot, at) => turns.findIndex((other) => sameAngle(2 * other, 2 * rot)) === at)
    .flatMap((rot) => {
      if (symmetrical) return [{ rot, halfTurns: false }];
      return [{ rot, halfTurns: opposite(rot) }];
    });
}

const sameAngle = (a: number, b: number): boolean => {
  const apart = (((a - b) % 360) + 360) % 360;
  return Math.min(apart, 360 - apart) < 1e-6;
};
