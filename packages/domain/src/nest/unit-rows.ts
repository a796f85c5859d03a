import type { Crystal, Member } from './crystal.ts';
import type { Pieces } from './envelope.ts';
import { chordAt, type RowFrame } from './row-frame.ts';
import { StepCurve } from './step-curve.ts';

/** A row in which every other piece is half turned: one upright piece, the turned one beside it. */
export interface UnitRow {
  pitch: number;
  members: readonly Member[];
}

/** Rows of pairs, the turned piece lifted by different heights against the upright one. */
export function unitRows(frame: RowFrame, lifts: number): UnitRow[] {
  return liftsOf(frame, lifts).flatMap((lift) => {
    const row = unitRow(frame, lift);
    return row ? [row] : [];
  });
}

/** Two kinds of rows of pairs with one pitch: in one the turned piece is lifted, in the other lowered. */
export function oppositeRows(frame: RowFrame, lifts: number): [UnitRow, UnitRow][] {
  return liftsOf(frame, lifts).flatMap((lift): [UnitRow, UnitRow][] => {
    const [raised, lowered] = [unitRow(frame, lift), unitRow(frame, -lift)];
    if (!raised || !lowered) return [];
    const pitch = Math.max(raised.pitch, lowered.pitch);
    return [
      [
        { ...raised, pitch },
        { ...lowered, pitch },
      ],
    ];
  });
}

function liftsOf({ turnedRings }: RowFrame, lifts: number): number[] {
  if (!turnedRings) return [];
  const heights = turnedRings.flatMap((ring) => ring.map(({ y }) => y));
  const [low, high] = [Math.min(...heights), Math.max(...heights)];
  return Array.from({ length: lifts - 1 }, (_, at) => low + ((high - low) * (at + 1)) / lifts);
}

function unitRow({ turnedRings, leastPitch }: RowFrame, lift: number): UnitRow | null {
  const [left, right] = chordAt(turnedRings ?? [], lift);
  if (!(right > left)) return null;
  return {
    pitch: Math.max(leastPitch, right - left),
    members: [
      { turn: 0, at: { x: 0, y: 0 } },
      { turn: 180, at: { x: right, y: lift } },
    ],
  };
}

/** The least step of a row of pairs over another, by its shift. */
export function unitCurve(frame: RowFrame, lower: UnitRow, upper: UnitRow): StepCurve {
  const pieces: number[] = [];
  for (const below of lower.members) {
    for (const above of upper.members) {
      const envelope = envelopeOf(frame, below, above);
      const [dx, dy] = [above.at.x - below.at.x, above.at.y - below.at.y];
      for (let at = 0; at < envelope.length; at += 2) {
        pieces.push((envelope[at] as number) - dx, (envelope[at + 1] as number) - dy);
      }
    }
  }
  return new StepCurve(pieces, Math.max(lower.pitch, upper.pitch));
}

function envelopeOf(frame: RowFrame, below: Member, above: Member): Pieces {
  if (below.turn === above.turn) return frame.sameOverSame;
  return (below.turn === 0 ? frame.turnedOverSame : frame.sameOverTurned) ?? [];
}

/** Rows of pairs all alike, each shifted against the one before. */
export function driftingUnits(row: UnitRow, curve: StepCurve, shift: number): Crystal {
  const height = Math.max(curve.at(shift), curve.at(2 * shift) / 2);
  return { along: { x: row.pitch, y: 0 }, across: { x: shift, y: height }, members: row.members };
}

/** Rows of pairs, every other one shifted. */
export function zigzagUnits(row: UnitRow, curve: StepCurve, shift: number): Crystal {
  const [up, down] = [curve.at(shift), curve.at(-shift)];
  const height = Math.max(up + down, curve.at(0));
  return {
    along: { x: row.pitch, y: 0 },
    across: { x: 0, y: height },
    members: [
      ...row.members,
      ...row.members.map(({ turn, at }) => ({ turn, at: { x: at.x + shift, y: at.y + up } })),
    ],
  };
}
