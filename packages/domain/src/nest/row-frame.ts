import type { Point } from '../outline/outline.ts';
import { type Pieces, upperEnvelope } from './envelope.ts';
import { direction } from './ring.ts';
import type { Ring } from './problem.ts';

/** No-fit polygons of a piece with itself and with itself half turned (null where not allowed). */
export interface NoFitPair {
  same: readonly Ring[];
  turned: readonly Ring[] | null;
}

/**
 * What rows in one direction need: how high above a piece at the origin another one must lie, as a
 * function of how far along it lies. Along the rows is x, away from them y.
 */
export interface RowFrame {
  /** the rows' direction in degrees counter-clockwise from the outline's own x */
  directionDeg: number;
  sameOverSame: Pieces;
  /** a half-turned piece over an upright one; null where pieces may not be half turned */
  turnedOverSame: Pieces | null;
  sameOverTurned: Pieces | null;
  /** the least distance that pieces of one row can repeat at */
  leastPitch: number;
  /** where a half-turned piece may not lie, the rows along x */
  turnedRings: readonly Ring[] | null;
}

export function rowFrame(noFit: NoFitPair, directionDeg: number): RowFrame {
  const same = noFit.same.map((ring) => alongX(ring, directionDeg));
  const turned = noFit.turned?.map((ring) => alongX(ring, directionDeg));
  return {
    directionDeg,
    sameOverSame: topOf(same),
    turnedOverSame: turned ? topOf(turned) : null,
    sameOverTurned: turned ? topOf(turned.map(mirrored)) : null,
    leastPitch: leastPitch(same),
    turnedRings: turned ?? null,
  };
}

function alongX(ring: Ring, directionDeg: number): Point[] {
  const by = direction(-directionDeg);
  return ring.map(({ x, y }) => ({ x: x * by.x - y * by.y, y: x * by.y + y * by.x }));
}

const mirrored = (ring: Ring): Point[] => ring.map(({ x, y }) => ({ x: -x, y: -y }));

/** Upper edges run towards negative x, in counter-clockwise rings. */
export function topOf(rings: readonly Ring[]): Pieces {
  const upper: number[] = [];
  for (const ring of rings) {
    let from = ring[ring.length - 1] as Point;
    for (const to of ring) {
      if (to.x < from.x - 1e-10) upper.push(to.x, to.y, from.x, from.y);
      from = to;
    }
  }
  return upperEnvelope(upper);
}

/** The least pitch of which no multiple lies inside the no-fit polygon, by where y = 0 crosses it. */
export function leastPitch(rings: readonly Ring[]): number {
  const inside = crossings(rings, 0).filter(([, to]) => to > 1e-9);
  const free = (pitch: number) =>
    inside.every(([from, to]) => {
      const multiple = Math.max(1, Math.ceil(from / pitch + 1e-9));
      return multiple * pitch >= to - 1e-9;
    });
  const candidates = inside.flatMap(([, to]) => [to, to / 2, to / 3]);
  return Math.min(...candidates.filter(free));
}

/** From where to where a line along x meets the rings, from the first place to the last. */
export function chordAt(rings: readonly Ring[], y: number): [left: number, right: number] {
  const pairs = crossings(rings, y);
  return [pairs[0]?.[0] ?? 0, pairs[pairs.length - 1]?.[1] ?? 0];
}

function crossings(rings: readonly Ring[], y: number): [number, number][] {
  const xs: number[] = [];
  for (const ring of rings) {
    let from = ring[ring.length - 1] as Point;
    for (const to of ring) {
      if (from.y > y !== to.y > y) {
        xs.push(from.x + ((y - from.y) / (to.y - from.y)) * (to.x - from.x));
      }
      from = to;
    }
  }
  xs.sort((a, b) => a - b);
  const pairs: [number, number][] = [];
  for (let at = 0; at + 1 < xs.length; at += 2) {
    pairs.push([xs[at] as number, xs[at + 1] as number]);
  }
  return pairs;
}
