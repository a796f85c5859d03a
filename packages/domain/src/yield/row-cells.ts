import type { Cell, Member, Room } from './cell.ts';
import type { Turned } from './layout.ts';
import type { HalfTurns, Piece } from './piece.ts';

/** A row's members within one period; the next row's may be half turned. */
interface Row {
  members: { turn: HalfTurns; x: number; y: number }[];
  period: number;
}

/** The fractions of a period by which every other row may be shifted. */
const shiftSteps = 24;
/** How finely the height of a half-turned neighbour is tried. */
const liftSteps = 24;
/** How much worse than the densest an arrangement may be to be looked at more closely. */
const nearlyBest = 1.15;
const refinements = [1 / 48, -1 / 48, 1 / 96, -1 / 96, 1 / 192, -1 / 192];

/**
 * Straight rows, rows of which every other is shifted, and rows of which every other is half turned.
 * Simpler ones come first, and win a tie.
 * @param halfTurnMatters false for outlines that look the same after half a turn
 */
export function* rowCells(piece: Piece, room: Room, halfTurnMatters: boolean): Generator<Cell> {
  yield* straightAndShifted(piece, room, halfTurnMatters);
  if (halfTurnMatters) yield* everyOtherRowTurned(piece, room);
}

function* straightAndShifted(piece: Piece, room: Room, halfTurnMatters: boolean): Generator<Cell> {
  const least = piece.beside(0, 0, 0);
  const fractions = halfTurnMatters
    ? range(0, shiftSteps / 2).map((at) => at / shiftSteps)
    : [0, 0.5];
  for (const fraction of fractions) {
    for (const period of periods(least, piece, room, fraction)) {
      yield stack(
        piece,
        { members: [alone(0)], period },
        { members: [alone(0)], period },
        fraction * period,
        'none',
      );
    }
  }
}

function* everyOtherRowTurned(piece: Piece, room: Room): Generator<Cell> {
  const least = piece.beside(0, 0, 0);
  const cellAt = (period: number, fraction: number): Cell =>
    stack(
      piece,
      { members: [alone(0)], period },
      { members: [alone(1)], period },
      fraction * period,
      'every other row',
    );
  const coarse = range(0, shiftSteps - 1).map((at) => at / shiftSteps);
  const best = densest(coarse, (fraction) => cellAt(least, fraction));
  for (const fraction of [...coarse, ...refinements.map((by) => best + by)]) {
    for (const period of periods(least, piece, room, fraction)) yield cellAt(period, fraction);
  }
}

/**
 * Rows of which every other piece is half turned, at every height that its neighbour can have. They
 * do not depend on the room. Shifted rows are tried only where straight ones are nearly the densest.
 */
export function pairCells(piece: Piece): Cell[] {
  const cellAt = (lift: number, fraction: number): Cell => {
    const row = pairRow(piece, lift);
    return stack(piece, row, row, fraction * row.period, 'every other piece');
  };
  const coarse = range(-liftSteps, liftSteps).map((at) => (at / liftSteps) * piece.height);
  const best = densest(coarse, (lift) => cellAt(lift, 0));
  const lifts = [...coarse, ...refinements.map((by) => best + by * 2 * piece.height)];
  const straight = lifts.map((lift) => cellAt(lift, 0));
  const least = Math.min(...straight.map(areaPerPiece));
  const promising = lifts.filter(
    (_, at) => areaPerPiece(straight[at] as Cell) <= nearlyBest * least,
  );
  const shifted = promising.flatMap((lift) => range(1, 7).map((at) => cellAt(lift, at / 8)));
  return [...straight, ...shifted];
}

const alone = (turn: HalfTurns) => ({ turn, x: 0, y: 0 });

const range = (from: number, to: number): number[] =>
  Array.from({ length: to - from + 1 }, (_, at) => from + at);

/** A piece and its half-turned neighbour, which lies `lift` higher. */
function pairRow(piece: Piece, lift: number): Row {
  const there = piece.beside(0, 1, lift);
  const back = piece.beside(1, 0, -lift);
  const closed = Math.max(there, 0) + Math.max(back, 0);
  const period = Math.max(closed, piece.beside(0, 0, 0));
  return {
    members: [alone(0), { turn: 1, x: Math.max(there, 0), y: lift }],
    period,
  };
}

/**
 * The least period, and those that spread n pieces over the whole width, with the next row's n
 * pieces between them or not: a wider row can let the next one sink in deeper.
 */
function periods(least: number, piece: Piece, room: Room, fraction: number): number[] {
  if (room.width === Infinity) {
    return fraction === 0 ? [least] : range(0, 60).map((at) => least * (1 + at / 60));
  }
  const free = room.width - piece.width;
  const most = Math.floor(free / least + 1e-9) + 1;
  const shift = Math.min(fraction, 1 - fraction);
  const spread =
    fraction === 0 ? [] : range(1, most).flatMap((n) => [free / (n - 1), free / (n - 1 + shift)]);
  const widest = 2 * (piece.width + piece.spacing);
  return [least, ...spread.filter((period) => period > least && period <= widest)];
}

/** Puts the second row on the first, shifted, and the first again on the second. */
function stack(piece: Piece, first: Row, second: Row, shift: number, turned: Turned): Cell {
  const period = first.period;
  const onFirst = rowStep(piece, first, second, shift);
  const onItself = Math.max(rowStep(piece, first, first, 0), rowStep(piece, second, second, 0));
  const members: Member[] = first.members.map((each) => ({ ...each, row: 0 }));
  if (shift === 0 && turned !== 'every other row') {
    return { members, periodX: period, periodY: onItself, rowsInCell: 1, turned, shift };
  }
  const onSecond = rowStep(piece, second, first, -shift);
  const step = Math.max(onFirst, 0);
  members.push(
    ...second.members.map((each) => ({ ...each, x: each.x + shift, y: each.y + step, row: 1 })),
  );
  const periodY = Math.max(step + Math.max(onSecond, 0), onItself);
  return { members, periodX: period, periodY, rowsInCell: 2, turned, shift };
}

/** The least distance between a row and the next above it. */
function rowStep(piece: Piece, below: Row, above: Row, shift: number): number {
  const reach = piece.width + piece.spacing;
  let step = -Infinity;
  for (const low of below.members) {
    for (const high of above.members) {
      const start = high.x + shift - low.x;
      const { x: lowX } = piece.corner[low.turn];
      const { x: highX } = piece.corner[high.turn];
      const boxes = start + highX - lowX;
      const from = Math.ceil((-reach - boxes) / below.period);
      const to = Math.floor((reach - boxes) / below.period);
      for (let k = from; k <= to; k += 1) {
        const height = piece.over(low.turn, high.turn, start + k * below.period);
        step = Math.max(step, height + low.y - high.y);
      }
    }
  }
  return step;
}

function densest(values: number[], cellAt: (value: number) => Cell): number {
  let best = { value: values[0] ?? 0, area: Infinity };
  for (const value of values) {
    const area = areaPerPiece(cellAt(value));
    if (area < best.area - 1e-9) best = { value, area };
  }
  return best.value;
}

const areaPerPiece = ({ periodX, periodY, members }: Cell): number =>
  (periodX * periodY) / members.length;
