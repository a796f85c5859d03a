import type { NestPlacement } from './problem.ts';
import type { RowFrame } from './row-frame.ts';
import type { StepCurve } from './step-curve.ts';
import type { StripCell, StripRules } from './strip-cell.ts';
import { oppositeRows, type UnitRow, unitCurve, unitRows } from './unit-rows.ts';

const lifts = 9;

/** Rows along a strip in which every other piece is half turned, as many as the width takes. */
export function unitsAlong(frame: RowFrame, rules: StripRules): StripCell[] {
  return [...alikeRows(frame, rules), ...opposedRows(frame, rules)].filter(
    ({ pieces }) => pieces.length > 0,
  );
}

function* alikeRows(frame: RowFrame, rules: StripRules): Generator<StripCell> {
  for (const row of unitRows(frame, lifts)) {
    const curve = unitCurve(frame, row, row);
    const over = [[curve]];
    for (const { shift } of curve.minima().slice(0, 3)) {
      yield stack([row], rules, [shift], over);
      yield stack([row], rules, [shift, -shift], over);
    }
  }
}

/** Every other row's turned pieces are lowered instead of lifted. */
function* opposedRows(frame: RowFrame, rules: StripRules): Generator<StripCell> {
  for (const rows of oppositeRows(frame, lifts)) {
    const over = rows.map((lower) => rows.map((upper) => unitCurve(frame, lower, upper)));
    const [ups, downs] = [over[0]?.[1]?.minima() ?? [], over[1]?.[0]?.minima() ?? []];
    for (const up of ups.slice(0, 3)) {
      yield stack(rows, rules, [up.shift, -up.shift], over);
      for (const down of downs.slice(0, 3)) {
        yield stack(rows, rules, [up.shift, down.shift], over);
      }
    }
  }
}

/** Rows one above the other, each clear of the three before it. */
function stack(
  kinds: readonly UnitRow[],
  rules: StripRules,
  shifts: readonly number[],
  over: readonly (readonly StepCurve[])[],
): StripCell {
  const spans = kinds.map((row) => spanOf(row, rules));
  const rows: { kind: number; x: number; y: number }[] = [];
  for (let at = 0; at < 20; at += 1) {
    const kind = at % kinds.length;
    const [least, most] = spans[kind] ?? [0, -1];
    const before = rows[at - 1];
    const x = before ? before.x + (shifts[(at - 1) % shifts.length] ?? 0) : 0;
    const steps = rows.slice(-3).map((row) => row.y + (over[row.kind]?.[kind]?.at(x - row.x) ?? 0));
    const y = Math.max(least, ...steps);
    if (y > most + 1e-9) break;
    rows.push({ kind, x, y });
  }
  const pieces = rows.flatMap(({ kind, x, y }) => piecesOf(kinds[kind], rules, x, y));
  return { periodMm: kinds[0]?.pitch ?? 0, pieces };
}

/** From where to where the first piece of a row may lie across the strip. */
function spanOf({ members }: UnitRow, rules: StripRules): [least: number, most: number] {
  const spans = members.map(({ turn, at }) => {
    const [least, most] = turn === 0 ? rules.upright : rules.halfTurned;
    return [least - at.y, most - at.y] as const;
  });
  return [Math.max(...spans.map(([low]) => low)), Math.min(...spans.map(([, high]) => high))];
}

const piecesOf = (
  row: UnitRow | undefined,
  { rot }: StripRules,
  x: number,
  y: number,
): NestPlacement[] =>
  (row?.members ?? []).map(({ turn, at }) => ({
    x: x + at.x,
    y: y + at.y,
    rot: (rot + turn) % 360,
  }));
