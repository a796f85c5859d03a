/**
 * A function of x made of straight pieces, flat: x0, y0, x1, y1 for each, x rising. Where no piece
 * lies the function has no value; where pieces meet it may jump.
 */
export type Pieces = readonly number[];

/** What is highest among straight pieces, each given as x0, y0, x1, y1 with x0 < x1. */
export function upperEnvelope(pieces: Pieces): number[] {
  const order = byLeftEnd(pieces);
  const stops = stopsOf(pieces);
  const found: number[] = [];
  let active: number[] = [];
  let next = 0;
  for (let at = 0; at + 1 < stops.length; at += 1) {
    const [left, right] = [stops[at] as number, stops[at + 1] as number];
    if (right - left < tiny) continue;
    active = active.filter((piece) => (pieces[piece + 2] as number) > left + tiny);
    while (next < order.length && (pieces[order[next] as number] as number) <= left + tiny) {
      active.push(order[next] as number);
      next += 1;
    }
    active = active.filter((piece) => (pieces[piece + 2] as number) > left + tiny);
    if (active.length > 0) climb(pieces, active, left, right, found);
  }
  return found;
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

function slopeOf(pieces: Pieces, at: number): number {
  const [x0, y0] = [pieces[at] as number, pieces[at + 1] as number];
  return ((pieces[at + 3] as number) - y0) / ((pieces[at + 2] as number) - x0);
}

const heightOf = (pieces: Pieces, at: number, x: number): number =>
  (pieces[at + 1] as number) + slopeOf(pieces, at) * (x - (pieces[at] as number));

/** Follows the highest piece from left to right and changes to another where it is overtaken. */
function climb(
  pieces: Pieces,
  active: readonly number[],
  left: number,
  right: number,
  found: number[],
): void {
  let x = left;
  for (let turns = 0; turns <= active.length && x < right - tiny; turns += 1) {
    const top = highest(pieces, active, x);
    const end = overtakenAt(pieces, active, top, x, right);
    append(found, x, heightOf(pieces, top, x), end, heightOf(pieces, top, end));
    x = end;
  }
}

function highest(pieces: Pieces, active: readonly number[], x: number): number {
  let best = active[0] as number;
  let height = heightOf(pieces, best, x);
  for (const piece of active) {
    const other = heightOf(pieces, piece, x);
    if (other < height - 1e-11) continue;
    if (other > height + 1e-11 || slopeOf(pieces, piece) > slopeOf(pieces, best)) {
      best = piece;
      height = other;
    }
  }
  return best;
}

function overtakenAt(
  pieces: Pieces,
  active: readonly number[],
  top: number,
  x: number,
  right: number,
): number {
  const [slope, height] = [slopeOf(pieces, top), heightOf(pieces, top, x)];
  let end = right;
  for (const piece of active) {
    const steeper = slopeOf(pieces, piece) - slope;
    if (steeper <= 1e-12) continue;
    const meets = x + (height - heightOf(pieces, piece, x)) / steeper;
    if (meets > x + tiny && meets < end) end = meets;
  }
  return end;
}

/** Lengthens the last piece where the new one goes straight on. */
function append(found: number[], x0: number, y0: number, x1: number, y1: number): void {
  const last = found.length - 4;
  if (last >= 0 && Math.abs((found[last + 2] as number) - x0) < tiny) {
    const straight = heightOf(found, last, x1);
    const meets = Math.abs((found[last + 3] as number) - y0) < 1e-9;
    if (meets && Math.abs(straight - y1) < 1e-9) {
      found[last + 2] = x1;
      found[last + 3] = y1;
      return;
    }
  }
  found.push(x0, y0, x1, y1);
}
