import type { NestPlacement } from './problem.ts';
import { pitchesFor } from './panel-rows.ts';
import type { RowFrame } from './row-frame.ts';
import { alternatingShifts, type RowCurves, rowCurves } from './row-patterns.ts';
import type { StripCell, StripRules } from './strip-cell.ts';

/** Rows along a strip: the shortest pitch for every number of rows that the width takes. */
export function rowsAlong(frame: RowFrame, rules: StripRules): StripCell[] {
  const best = new Map<string, StripCell>();
  const widest = frame.leastPitch * (frame.turnedOverSame ? 2.4 : 1.8);
  const steps = 22;
  for (let at = 0; at <= steps; at += 1) {
    const pitch = frame.leastPitch + ((widest - frame.leastPitch) * at) / steps;
    const curves = rowCurves(frame, pitch);
    for (const cell of [...stackedAlike(curves, rules), ...stackedTurned(curves, rules)]) {
      const kind = cell.pieces.map(({ rot }) => rot).join(' ');
      const known = best.get(kind);
      if (!known || cell.periodMm < known.periodMm) best.set(kind, cell);
    }
  }
  return [...best.values()];
}

const roomOf = ([least, most]: readonly [number, number]): number => most - least;

function* stackedAlike({ pitch, same }: RowCurves, rules: StripRules): Generator<StripCell> {
  const room = roomOf(rules.upright);
  if (room < 0) return;
  for (const { shift } of same.minima().slice(0, 3)) {
    const height = Math.max(same.at(shift), same.at(2 * shift) / 2, same.at(3 * shift) / 3);
    const rows = height > 0 ? Math.floor(room / height + 1e-9) + 1 : 1;
    yield {
      periodMm: pitch,
      pieces: Array.from({ length: Math.min(rows, 40) }, (_, row) => ({
        x: row * shift,
        y: rules.upright[0] + row * height,
        rot: rules.rot,
      })),
    };
  }
}

function* stackedTurned(curves: RowCurves, rules: StripRules): Generator<StripCell> {
  for (const [up, down] of alternatingShifts(curves, 3)) {
    for (const first of [0, 1] as const) {
      const pieces = turnedStack(curves, rules, [up, down], first);
      if (pieces.length > 0) yield { periodMm: curves.pitch, pieces };
    }
  }
}

/** Rows one above the other as long as there is room, each clear of the three before it. */
function turnedStack(
  curves: RowCurves,
  rules: StripRules,
  shifts: readonly [number, number],
  first: 0 | 1,
): NestPlacement[] {
  const rows: { kind: 0 | 1; x: number; y: number }[] = [];
  for (let row = 0; row < 40; row += 1) {
    const kind = ((row + first) % 2) as 0 | 1;
    const [least, most] = kind === 0 ? rules.upright : rules.halfTurned;
    const before = rows[rows.length - 1];
    const x = before ? before.x + shifts[before.kind] : 0;
    const y = Math.max(
      least,
      ...rows.slice(-3).map((lower) => lower.y + stepOver(curves, lower, kind, x)),
    );
    if (y > most + 1e-9) break;
    rows.push({ kind, x, y });
  }
  return rows.map(({ kind, x, y }) => ({
    x,
    y,
    rot: kind === 0 ? rules.rot : (rules.rot + 180) % 360,
  }));
}

function stepOver(
  curves: RowCurves,
  lower: { kind: 0 | 1; x: number },
  kind: 0 | 1,
  x: number,
): number {
  if (lower.kind === kind) return curves.same.at(x - lower.x);
  const curve = lower.kind === 0 ? curves.up : curves.down;
  return curve ? curve.at(x - lower.x) : 0;
}

/** Rows across a strip, from edge to edge, alike or every other one shifted or half turned. */
export function rowsAcross(frame: RowFrame, rules: StripRules): StripCell[] {
  const room = roomOf(rules.upright);
  if (room < 0) return [];
  const cells: StripCell[] = [];
  for (const pitch of pitchesFor(frame.leastPitch, room, 16, frame.turnedOverSame !== null)) {
    const curves = rowCurves(frame, pitch);
    cells.push(...acrossAlike(curves, rules), ...acrossTurned(curves, rules));
  }
  return cells;
}

/** A row across from a start upwards, as far as there is room. */
function rowUp(
  rot: number,
  x: number,
  [least, most]: readonly [number, number],
  start: number,
  pitch: number,
): NestPlacement[] {
  const pieces: NestPlacement[] = [];
  for (let y = least + start; y <= most + 1e-9; y += pitch) pieces.push({ x, y, rot });
  return pieces;
}

function* acrossAlike(
  { pitch, same }: RowCurves,
  { upright, rot }: StripRules,
): Generator<StripCell> {
  const spare = roomOf(upright) % pitch;
  yield { periodMm: same.at(0), pieces: rowUp(rot, 0, upright, 0, pitch) };
  const shifts = [
    spare,
    pitch / 2,
    ...same
      .minima()
      .slice(0, 4)
      .map(({ shift }) => shift),
  ];
  for (const shift of shifts) {
    const height = Math.max(same.at(shift), same.at(-shift), same.at(0) / 2);
    const start = ((shift % pitch) + pitch) % pitch;
    yield {
      periodMm: 2 * height,
      // Rows across run up the strip, so the next row lies towards negative x.
      pieces: [...rowUp(rot, height, upright, 0, pitch), ...rowUp(rot, 0, upright, start, pitch)],
    };
  }
}

function* acrossTurned(curves: RowCurves, rules: StripRules): Generator<StripCell> {
  const { pitch, up, down, same } = curves;
  if (!up || !down) return;
  const { upright, halfTurned, rot } = rules;
  const offset = halfTurned[0] - upright[0];
  const spare = roomOf(upright) % pitch;
  const shifts = [0, spare, pitch / 2, spare / 2];
  for (const [first, second] of alternatingShifts(curves, 4)) {
    shifts.push(first - offset, -second - offset);
  }
  for (let at = 1; at < 12; at += 1) shifts.push((pitch * at) / 12);
  for (const shift of shifts) {
    const start = ((shift % pitch) + pitch) % pitch;
    for (const [low, high] of [
      [0, start],
      [pitch - start, 0],
    ] as const) {
      const between = offset + high - low;
      const [lift, drop] = [up.at(between), down.at(-between)];
      const height = Math.max(lift + drop, same.at(0));
      yield {
        periodMm: height,
        pieces: [
          ...rowUp(rot, 0, upright, low % pitch, pitch),
          ...rowUp((rot + 180) % 360, -lift, halfTurned, high, pitch),
        ],
      };
    }
  }
}
