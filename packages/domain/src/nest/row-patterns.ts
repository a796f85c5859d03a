import type { Crystal } from './crystal.ts';
import type { RowFrame } from './row-frame.ts';
import { type Step, StepCurve } from './step-curve.ts';

/** The step curves of one direction at one pitch. */
export interface RowCurves {
  pitch: number;
  same: StepCurve;
  up: StepCurve | null;
  down: StepCurve | null;
}

export function rowCurves(frame: RowFrame, pitch: number): RowCurves {
  const { sameOverSame, turnedOverSame, sameOverTurned } = frame;
  return {
    pitch,
    same: new StepCurve(sameOverSame, pitch),
    up: turnedOverSame && new StepCurve(turnedOverSame, pitch),
    down: sameOverTurned && new StepCurve(sameOverTurned, pitch),
  };
}

/** Rows all alike, each shifted by the same against the one before. Rows lie along x. */
export function driftingRows({ same, pitch }: RowCurves, shift: number): Crystal {
  const height = Math.max(same.at(shift), same.at(2 * shift) / 2, same.at(3 * shift) / 3);
  return {
    along: { x: pitch, y: 0 },
    across: { x: shift, y: height },
    members: [{ turn: 0, at: { x: 0, y: 0 } }],
  };
}

/** Rows all alike, every other one shifted. */
export function zigzagRows({ same, pitch }: RowCurves, shift: number): Crystal {
  const height = Math.max(same.at(shift), same.at(-shift), same.at(0) / 2);
  return {
    along: { x: pitch, y: 0 },
    across: { x: 0, y: 2 * height },
    members: [
      { turn: 0, at: { x: 0, y: 0 } },
      { turn: 0, at: { x: shift, y: height } },
    ],
  };
}

/**
 * Rows of which every other is half turned: shifted by `up` against the upright row below, and the
 * next upright one by `down` against it.
 */
export function alternatingRows(curves: RowCurves, up: number, down: number): Crystal | null {
  const { pitch, same } = curves;
  if (!curves.up || !curves.down) return null;
  const lift = curves.up.at(up);
  const across = up + down;
  const height = Math.max(
    lift + curves.down.at(down),
    same.at(across),
    same.at(2 * across) / 2,
    curves.up.at(up + across) - lift,
    (curves.down.at(down + across) + lift) / 2,
  );
  return {
    along: { x: pitch, y: 0 },
    across: { x: across, y: height },
    members: [
      { turn: 0, at: { x: 0, y: 0 } },
      { turn: 180, at: { x: up, y: lift } },
    ],
  };
}

/** The shifts worth trying for alternating rows, by where the steps are least. */
export function alternatingShifts(curves: RowCurves, most: number): [up: number, down: number][] {
  if (!curves.up || !curves.down) return [];
  const ups = curves.up.minima().slice(0, most);
  const downs = curves.down.minima().slice(0, most);
  const together = curves.same.minima().slice(0, Math.ceil(most / 2));
  const pairs: [number, number][] = [];
  for (const up of ups) {
    for (const down of downs) pairs.push([up.shift, down.shift]);
    for (const both of together) pairs.push([up.shift, both.shift - up.shift]);
  }
  for (const down of downs.slice(0, 2)) {
    for (const both of together) pairs.push([both.shift - down.shift, down.shift]);
  }
  return pairs;
}

/** The shifts worth trying for rows all alike. */
export function driftShifts(curves: RowCurves, most: number): number[] {
  return curves.same
    .minima()
    .slice(0, most)
    .map(({ shift }: Step) => shift);
}
