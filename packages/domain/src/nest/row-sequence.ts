import type { Pieces } from './envelope.ts';
import type { Surroundings } from './layout-state.ts';
import type { NestPlacement } from './problem.ts';
import { ringBounds } from './ring.ts';

/** One row of equal pieces along x: where they lie when the row lies at y = 0. */
interface Row {
  rot: number;
  xs: readonly number[];
  /** least and most y of its pieces' origins */
  least: number;
  most: number;
}

/**
 * Rows of any kinds one above the other with the most pieces, by a dynamic programme over how many
 * pieces have been laid and which row came last. Rows lie along the panel's x.
 */
export function rowSequences(around: Surroundings, rots: readonly number[]): NestPlacement[][] {
  const rows = rots.flatMap((rot) => rowsOf(around, rot));
  if (rows.length === 0) return [];
  const steps = rows.map((lower) => rows.map((upper) => stepOver(around, lower, upper)));
  return bestStacks(rows, steps, around.reach).flatMap((stack) => {
    const laid = laidOut(stack, rows, steps);
    return laid ? [laid] : [];
  });
}

/** As many as fit and one fewer; close together at either end or in the middle, or spread out. */
function rowsOf(around: Surroundings, rot: number): Row[] {
  const free = around.room.free(rot);
  if (free.length === 0) return [];
  const { minX, maxX, minY, maxY } = ringBounds(free);
  const pitch = around.leastPitch(rot);
  const most = Math.floor((maxX - minX) / pitch + 1e-9) + 1;
  const rows: Row[] = [];
  for (const count of [most, most - 1]) {
    if (count < 1) continue;
    const spare = maxX - minX - (count - 1) * pitch;
    const spread = count > 1 ? (maxX - minX) / (count - 1) : 0;
    const half = (maxX - minX) / count;
    const starts: [start: number, pitch: number][] = [
      [0, pitch],
      [spare, pitch],
      [spare / 2, pitch],
      [0, spread],
      [half / 2, half],
    ];
    for (const [start, apart] of starts) {
      if (apart < pitch - 1e-9 && count > 1) continue;
      const xs = Array.from({ length: count }, (_, at) => minX + start + at * apart);
      if ((xs[count - 1] ?? 0) > maxX + 1e-9) continue;
      rows.push({ rot, xs, least: minY, most: maxY });
    }
  }
  return rows;
}

function stepOver(around: Surroundings, lower: Row, upper: Row): number {
  const envelope = around.topOf(lower.rot, upper.rot);
  let step = 0;
  for (const below of lower.xs) {
    for (const above of upper.xs) step = Math.max(step, heightAt(envelope, above - below));
  }
  return step;
}

function heightAt(envelope: Pieces, x: number): number {
  let [low, high] = [0, envelope.length / 4];
  while (low < high) {
    const middle = (low + high) >> 1;
    if ((envelope[middle * 4 + 2] as number) <= x) low = middle + 1;
    else high = middle;
  }
  const at = low * 4;
  if (at >= envelope.length || x < (envelope[at] as number)) return 0;
  const [x0, y0] = [envelope[at] as number, envelope[at + 1] as number];
  const [x1, y1] = [envelope[at + 2] as number, envelope[at + 3] as number];
  return y0 + ((y1 - y0) * (x - x0)) / (x1 - x0);
}

interface State {
  y: number;
  before: number;
}

/** So many stacks of one count, and so many counts: rows further apart are not looked at, and some of the highest cannot be cut. */
const [mostStacks, mostCounts] = [4, 4];

/** For every count and last row the lowest stack; the stacks with the most pieces, as row numbers. */
function bestStacks(
  rows: readonly Row[],
  steps: readonly (readonly number[])[],
  reach: number,
): number[][] {
  const states: (State | undefined)[][] = [];
  const set = (count: number, row: number, state: State) => {
    const list = (states[count] ??= []);
    if (state.y < (list[row]?.y ?? Infinity) - 1e-9) list[row] = state;
  };
  rows.forEach(({ xs, least }, row) => set(xs.length, row, { y: least, before: -1 }));
  for (let count = 1; count < states.length; count += 1) {
    states[count]?.forEach((state, last) => {
      if (!state) return;
      rows.forEach((row, next) => {
        const step = steps[last]?.[next] ?? 0;
        const y = Math.max(row.least, state.y + step);
        // Rows beside each other would go on for ever.
        if (step > 1e-2 * reach && y <= row.most + 1e-9)
          set(count + row.xs.length, next, { y, before: last });
      });
    });
  }
  return ends(states, rows);
}

function ends(states: readonly (State | undefined)[][], rows: readonly Row[]): number[][] {
  const stacks: number[][] = [];
  const lowest = Math.max(1, states.length - mostCounts);
  for (let count = states.length - 1; count >= lowest; count -= 1) {
    const full = stacks.length + mostStacks;
    states[count]?.forEach((state, last) => {
      if (!state || stacks.length >= full) return;
      const stack: number[] = [];
      for (let [left, row] = [count, last]; row >= 0;) {
        stack.unshift(row);
        const before = states[left]?.[row]?.before ?? -1;
        left -= rows[row]?.xs.length ?? left;
        row = before;
      }
      stacks.push(stack);
    });
  }
  return stacks;
}

/** The rows laid one by one, clear of the three before; null where they do not all fit. */
function laidOut(
  stack: readonly number[],
  rows: readonly Row[],
  steps: readonly (readonly number[])[],
): NestPlacement[] | null {
  const ys: number[] = [];
  for (const [at, kind] of stack.entries()) {
    const row = rows[kind] as Row;
    let y = row.least;
    for (let back = Math.max(0, at - 3); back < at; back += 1) {
      y = Math.max(y, (ys[back] as number) + (steps[stack[back] as number]?.[kind] ?? 0));
    }
    if (y > row.most + 1e-9) return null;
    ys.push(y);
  }
  return stack.flatMap((kind, at) => {
    const { xs, rot } = rows[kind] as Row;
    return xs.map((x) => ({ x, y: ys[at] as number, rot }));
  });
}
