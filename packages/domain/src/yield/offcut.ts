import { InvalidInput } from '../errors/domain-error.ts';
import type { Point } from '../outline/outline.ts';
import { nextCorner, type Ring, ringBounds } from '../outline/ring.ts';

export interface Offcut {
  x: number;
  y: number;
  widthMm: number;
  heightMm: number;
}

/** Of the longer side, in cells: fine enough for a rack's label, coarse enough for a phone. */
const cellsAcross = 400;

/**
 * The largest upright rectangle that is left of a piece of leather when some pieces are cut and the
 * flaws are avoided, in mm; null where nothing is left of at least `leastMm` on both sides. Found on
 * a grid of 1/400 of the longer side, and never too large: a cell that anything touches is lost.
 * @param edge of the leather, a simple polygon · @param taken polygons that are cut away or flawed
 * @throws InvalidInput for an edge without area
 */
export function largestOffcut(edge: Ring, taken: readonly Ring[], leastMm = 20): Offcut | null {
  const bounds = ringBounds(edge);
  const size = { x: bounds.maxX - bounds.minX, y: bounds.maxY - bounds.minY };
  const cell = Math.max(size.x, size.y) / cellsAcross;
  if (!(cell > 0)) throw new InvalidInput('edge', 'The leather has no area.');
  const grid = new Grid(bounds.minX, bounds.minY, cell, size);
  grid.keepInside(edge);
  for (const ring of taken) grid.lose(ring);
  const found = grid.largestFree(Math.ceil(leastMm / cell));
  return (
    found && {
      x: grid.x + found.column * cell,
      y: grid.y + found.row * cell,
      widthMm: found.columns * cell,
      heightMm: found.rows * cell,
    }
  );
}

interface Block {
  column: number;
  row: number;
  columns: number;
  rows: number;
}

/** Cells of leather: 1 is free. Whole cells only, so that what is left fits within the edge. */
class Grid {
  readonly columns: number;
  readonly rows: number;
  private readonly free: Uint8Array;

  constructor(
    readonly x: number,
    readonly y: number,
    private readonly cell: number,
    size: Point,
  ) {
    // A hair of slack: a panel's own edge must not cost a cell for a rounding.
    this.columns = Math.floor(size.x / cell + 1e-9);
    this.rows = Math.floor(size.y / cell + 1e-9);
    this.free = new Uint8Array(this.columns * this.rows);
  }

  /** Frees the cells whose middles lie inside, and loses those that the edge runs through. */
  keepInside(edge: Ring): void {
    this.markInside(edge, 1);
    this.loseAlong(edge);
  }

  lose(ring: Ring): void {
    this.markInside(ring, 0);
    this.loseAlong(ring);
  }

  private markInside(ring: Ring, value: 0 | 1): void {
    for (let row = 0; row < this.rows; row += 1) {
      const crossings = crossingsAt(ring, this.y + (row + 0.5) * this.cell);
      for (let at = 0; at + 1 < crossings.length; at += 2) {
        const from = Math.ceil(((crossings[at] as number) - this.x) / this.cell - 0.5);
        const to = Math.floor(((crossings[at + 1] as number) - this.x) / this.cell - 0.5);
        const start = row * this.columns;
        if (to >= 0 && from < this.columns) {
          this.free.fill(value, start + Math.max(0, from), start + Math.min(this.columns, to + 1));
        }
      }
    }
  }

  /** Loses every cell whose inside an edge of the ring passes through. */
  private loseAlong(ring: Ring): void {
    const slack = 1e-6;
    ring.forEach((from, at) => {
      const to = nextCorner(ring, at);
      const [lowY, highY] = from.y < to.y ? [from.y, to.y] : [to.y, from.y];
      const first = Math.max(0, Math.floor((lowY - this.y) / this.cell + slack));
      const last = Math.min(this.rows - 1, Math.ceil((highY - this.y) / this.cell - slack) - 1);
      for (let row = first; row <= last; row += 1) {
        const top = this.y + row * this.cell;
        const [left, right] = spanWithin(from, to, top, top + this.cell);
        const begin = Math.max(0, Math.floor((left - this.x) / this.cell + slack));
        const end = Math.min(this.columns, Math.ceil((right - this.x) / this.cell - slack));
        if (end > begin) this.free.fill(0, row * this.columns + begin, row * this.columns + end);
      }
    });
  }

  /** The free block of most cells with at least so many on each side: row by row, by how far cells are free upwards. */
  largestFree(least: number): Block | null {
    const heights = new Array<number>(this.columns).fill(0);
    let best: Block | null = null;
    for (let row = 0; row < this.rows; row += 1) {
      for (let column = 0; column < this.columns; column += 1) {
        const isFree = this.free[row * this.columns + column] === 1;
        heights[column] = isFree ? (heights[column] as number) + 1 : 0;
      }
      for (const { column, columns, rows } of blocksUnder(heights)) {
        if (columns < least || rows < least) continue;
        if (best && columns * rows <= best.columns * best.rows) continue;
        best = { column, columns, rows, row: row - rows + 1 };
      }
    }
    return best;
  }
}

/** Where the ring crosses a height, from left to right. */
function crossingsAt(ring: Ring, y: number): number[] {
  const crossings: number[] = [];
  ring.forEach((from, at) => {
    const to = nextCorner(ring, at);
    if (from.y > y === to.y > y) return;
    crossings.push(from.x + ((y - from.y) / (to.y - from.y)) * (to.x - from.x));
  });
  return crossings.sort((a, b) => a - b);
}

/** From where to where an edge runs between two heights. */
function spanWithin(from: Point, to: Point, top: number, bottom: number): [number, number] {
  const at = (y: number) =>
    from.y === to.y ? from.x : from.x + ((y - from.y) / (to.y - from.y)) * (to.x - from.x);
  const [lowY, highY] = from.y < to.y ? [from.y, to.y] : [to.y, from.y];
  const ends =
    from.y === to.y ? [from.x, to.x] : [at(Math.max(top, lowY)), at(Math.min(bottom, highY))];
  return [Math.min(...ends), Math.max(...ends)];
}

/** The widest block under each height of a row of columns, by a stack of rising heights. */
function* blocksUnder(heights: readonly number[]): Generator<Omit<Block, 'row'>> {
  const rising: { column: number; rows: number }[] = [];
  for (let column = 0; column <= heights.length; column += 1) {
    const rows = heights[column] ?? 0;
    let start = column;
    for (let top = rising.at(-1); top && top.rows >= rows; top = rising.at(-1)) {
      rising.pop();
      if (top.rows > 0) yield { column: top.column, columns: column - top.column, rows: top.rows };
      start = top.column;
    }
    rising.push({ column: start, rows });
  }
}
