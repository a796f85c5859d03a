import type { Crystal } from './crystal.ts';
import type { RowFrame } from './row-frame.ts';
import {
  alternatingRows,
  alternatingShifts,
  driftingRows,
  driftShifts,
  type RowCurves,
  rowCurves,
  zigzagRows,
} from './row-patterns.ts';
import { driftingUnits, unitCurve, unitRows, zigzagUnits } from './unit-rows.ts';

/** The room that rows have, by the places of the pieces' origins. */
export interface RowRoom {
  /** how far the first and the last piece of a row can lie apart, in mm */
  length: number;
  /** where a half-turned piece's origin lies against an upright one's at the start of a row */
  turnedStart: number;
}

/** How closely pitches and shifts are looked at. */
export interface RowEffort {
  pitches: number;
  shifts: number;
}

/** Patterns whose rows lie along x, with pitches and shifts that suit rows of a given length. */
export function* rowsFor(frame: RowFrame, room: RowRoom, effort: RowEffort): Generator<Crystal> {
  const turns = frame.turnedOverSame !== null;
  for (const pitch of pitchesFor(frame.leastPitch, room.length, effort.pitches, turns)) {
    const curves = rowCurves(frame, pitch);
    yield* straight(curves, room, effort);
    yield* alternating(curves, room, effort);
  }
  yield* pairs(frame, room, effort);
}

function* pairs(frame: RowFrame, { length }: RowRoom, effort: RowEffort): Generator<Crystal> {
  for (const row of unitRows(frame, effort.pitches)) {
    const curve = unitCurve(frame, row, row);
    const least = curve.minima().slice(0, effort.shifts);
    const spare = spareOf(length, row.pitch);
    for (const { shift } of least) yield driftingUnits(row, curve, shift);
    for (const shift of [0, row.pitch / 2, spare, ...least.map((step) => step.shift)]) {
      yield zigzagUnits(row, curve, shift);
    }
  }
}

/** The least pitch, and such as leave a row's end no waste or room for half a pitch's shift. */
export function pitchesFor(least: number, length: number, most: number, turns: boolean): number[] {
  if (!(least > 0) || least === Infinity) return [];
  const fits = Math.floor(length / least + 1e-9);
  const widest = least * (turns ? 2.3 : 1.8);
  const pitches = [least];
  for (let gaps = fits; gaps >= 1 && length / (gaps + 0.75) <= widest; gaps -= 1) {
    for (const spare of [0.5, 0, 0.25, 0.75]) {
      const pitch = length / (gaps + spare);
      if (pitch > least && pitch <= widest) pitches.push(pitch);
    }
  }
  const steps = Math.max(2, Math.floor(most / 3));
  for (let at = 1; at <= steps; at += 1) pitches.push(least + ((widest - least) * at) / steps);
  return pitches.slice(0, most);
}

function* straight(curves: RowCurves, room: RowRoom, effort: RowEffort): Generator<Crystal> {
  const { pitch } = curves;
  const spare = spareOf(room.length, pitch);
  const least = driftShifts(curves, effort.shifts);
  for (const shift of least) yield driftingRows(curves, shift);
  for (const shift of [0, pitch / 2, spare, spare / 2, ...least]) yield zigzagRows(curves, shift);
  for (const parts of [1, 2, 3, 4, 5, 6]) yield driftingRows(curves, spare / parts);
}

function* alternating(curves: RowCurves, room: RowRoom, effort: RowEffort): Generator<Crystal> {
  const { pitch, up, down } = curves;
  if (!up || !down) return;
  const spare = spareOf(room.length, pitch);
  const { turnedStart } = room;
  const both = alternatingShifts(curves, effort.shifts);
  const back = [
    ...[0, spare, -spare, spare / 2, -spare / 2, pitch / 2].map((shift) => turnedStart + shift),
    ...both.map(([shift]) => shift),
    ...both.map(([, shift]) => -shift),
    ...leastSums((shift) => up.at(shift) + down.at(-shift), pitch, effort.shifts),
  ];
  const pairs = [...both, ...new Set(back)].map((shifts) =>
    typeof shifts === 'number' ? ([shifts, -shifts] as const) : shifts,
  );
  for (const [first, second] of pairs) {
    const crystal = alternatingRows(curves, first, second);
    if (crystal) yield crystal;
  }
}

const spareOf = (length: number, pitch: number): number =>
  length - Math.floor(length / pitch + 1e-9) * pitch;

/** Where a function that repeats with the pitch is least among what is tried. */
function leastSums(sum: (shift: number) => number, pitch: number, most: number): number[] {
  const tried = Array.from({ length: 24 }, (_, at) => (pitch * at) / 24)
    .map((shift) => ({ shift, height: sum(shift) }))
    .sort((a, b) => a.height - b.height);
  return tried.slice(0, most).map(({ shift }) => nearestLeast(sum, shift, pitch / 24));
}

function nearestLeast(sum: (shift: number) => number, start: number, width: number): number {
  let [best, height] = [start, sum(start)];
  for (let step = width / 2; step > width / 4000; step /= 2) {
    for (const shift of [best - step, best + step]) {
      const other = sum(shift);
      if (other < height) [best, height] = [shift, other];
    }
  }
  return best;
}
