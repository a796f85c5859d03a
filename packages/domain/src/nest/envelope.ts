/**
 * A function of x made of straight pieces, flat: x0, y0, x1, y1 for each, x rising. Where no piece
 * lies the function has no value; where pieces meet it may jump.
 */
export type Pieces = readonly number[];

/** What is highest among straight pieces, each given as x0, y0, x1, y1 with x0 < x1. */
export function upperEnvelope(pieces: Pieces): number[] {
  const order = byLeftEnd(pieces);
  const stops = stopsOf(pieces);
  const lines: Lines = { pieces, slopes: slopesOf(pieces), active: [] };
  const found: number[] = [];
  let next = 0;
  for (let at = 0; at + 1 < stops.length; at += 1) {
    const left = stops[at] as number;
    const right = stops[at + 1] as number;
    if (right - left < tiny) continue;
    while (next < order.length && (pieces[order[next] as number] as number) <= left + tiny) {
      lines.active.push(order[next] as number);
      next += 1;
    }
    dropEnded(lines, left);
    if (lines.active.length > 0) climb(lines, left, right, found);
  }
  return found;
}

/** The pieces with their slopes, worked out once, and those that lie over the place at hand. */
interface Lines {
  pieces: Pieces;
  slopes: Float64Array;
  active: number[];
}

/** Kept in the same list, since this is done at every stop. */
function dropEnded({ pieces, active }: Lines, left: number): void {
  let kept = 0;
  for (const piece of active) {
    if ((pieces[piece + 2] as number) <= left + tiny) continue;
    active[kept] = piece;
    kept += 1;
  }
  active.length = kept;
}

const tiny = 1e-10;

function byLeftEnd(pieces: Pieces): number[] {
  const order: number[] = [];
  for (let at = 0; at < pieces.length; at += 4) order.push(at);
  return order.sort((a, b) => (pieces[a] as number) - (pieces[b] as number));
}

function stopsOf(pieces: Pieces): Float64Array {
  const stops = new Float64Array(pieces.length / 2);
  for (let at = 0; at < pieces.length; at += 2) stops[at / 2] = pieces[at] as number;
  return stops.sort();
}

function slopesOf(pieces: Pieces): Float64Array {
  const slopes = new Float64Array(pieces.length / 4);
  for (let at = 0; at < pieces.length; at += 4) slopes[at / 4] = slopeOf(pieces, at);
  return slopes;
}

function slopeOf(pieces: Pieces, at: number): number {
  const rise = (pieces[at + 3] as number) - (pieces[at + 1] as number);
  return rise / ((pieces[at + 2] as number) - (pieces[at] as number));
}

const heightOf = ({ pieces, slopes }: Lines, at: number, x: number): number =>
  (pieces[at + 1] as number) + (slopes[at >> 2] as number) * (x - (pieces[at] as number));

/** Follows the highest piece from left to right and changes to another where it is overtaken. */
function climb(lines: Lines, left: number, right: number, found: number[]): void {
  let x = left;
  for (let turns = 0; turns <= lines.active.length && x < right - tiny; turns += 1) {
    const top = highest(lines, x);
    const end = overtakenAt(lines, top, x, right);
    append(found, x, heightOf(lines, top, x), end, heightOf(lines, top, end));
    x = end;
  }
}

function highest(lines: Lines, x: number): number {
  const { active, slopes } = lines;
  let best = active[0] as number;
  let height = heightOf(lines, best, x);
  for (const piece of active) {
    const other = heightOf(lines, piece, x);
    if (other < height - 1e-11) continue;
    if (other > height + 1e-11 || (slopes[piece >> 2] as number) > (slopes[best >> 2] as number)) {
      best = piece;
      height = other;
    }
  }
  return best;
}

function overtakenAt(lines: Lines, top: number, x: number, right: number): number {
  const slope = lines.slopes[top >> 2] as number;
  const height = heightOf(lines, top, x);
  let end = right;
  for (const piece of lines.active) {
    const steeper = (lines.slopes[piece >> 2] as number) - slope;
    if (steeper <= 1e-12) continue;
    const meets = x + (height - heightOf(lines, piece, x)) / steeper;
    if (meets > x + tiny && meets < end) end = meets;
  }
  return end;
}

/** Lengthens the last piece where the new one goes straight on. */
function append(found: number[], x0: number, y0: number, x1: number, y1: number): void {
  const last = found.length - 4;
  if (last >= 0 && Math.abs((found[last + 2] as number) - x0) < tiny) {
    const run = x1 - (found[last] as number);
    const straight = (found[last + 1] as number) + slopeOf(found, last) * run;
    const meets = Math.abs((found[last + 3] as number) - y0) < 1e-9;
    if (meets && Math.abs(straight - y1) < 1e-9) {
      found[last + 2] = x1;
      found[last + 3] = y1;
      return;
    }
  }
  found.push(x0, y0, x1, y1);
}
