import type { Point } from './outline.ts';

/** A straight stretch from corner to corner. */
export interface Side {
  from: Point;
  to: Point;
}

/** Answers whether any side passes a point at less than `distance`, up to the one it was made for. */
export type PassesWithin = (point: Point, distance: number) => boolean;

/**
 * Sorts sides into squares one and a half times as wide as the largest distance asked for, by points
 * half a square apart on them: whatever passes a point lies in its square or one beside it.
 */
export function nearSides(sides: readonly Side[], largest: number): PassesWithin {
  const size = 1.5 * largest;
  const squares = new Map<number, Side[]>();
  for (const side of sides) {
    const count = Math.ceil(lengthOf(side) / (size / 2));
    for (let at = 0; at <= count; at += 1) {
      const { x, y } = along(side, count === 0 ? 0 : at / count);
      const key = keyOf(Math.floor(x / size), Math.floor(y / size));
      const square = squares.get(key);
      if (square === undefined) squares.set(key, [side]);
      else if (square.at(-1) !== side) square.push(side);
    }
  }
  return (point, distance) => {
    const [column, row] = [Math.floor(point.x / size), Math.floor(point.y / size)];
    for (let x = column - 1; x <= column + 1; x += 1) {
      for (let y = row - 1; y <= row + 1; y += 1) {
        const square = squares.get(keyOf(x, y));
        if (square?.some((side) => distanceTo(side, point) < distance)) return true;
      }
    }
    return false;
  };
}

const keyOf = (column: number, row: number): number => column * 1_000_000 + row;

export const lengthOf = ({ from, to }: Side): number => Math.hypot(to.x - from.x, to.y - from.y);

export const along = ({ from, to }: Side, share: number): Point => ({
  x: from.x + (to.x - from.x) * share,
  y: from.y + (to.y - from.y) * share,
});

function distanceTo({ from, to }: Side, { x, y }: Point): number {
  const [dx, dy] = [to.x - from.x, to.y - from.y];
  const reach = ((x - from.x) * dx + (y - from.y) * dy) / (dx * dx + dy * dy || 1);
  const share = Math.min(1, Math.max(0, reach));
  return Math.hypot(x - from.x - share * dx, y - from.y - share * dy);
}
