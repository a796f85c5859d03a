/** Middles of equal discs, as many x as y, in mm. */
export interface Middles {
  x: Float64Array;
  y: Float64Array;
}

/** A box that the middles of discs must stay in, and the least distance between two of them. */
export interface DiscBox {
  width: number;
  height: number;
  apart: number;
}

const sweeps = 400;
/** Discs are parted a little more than needed, so that what remains of a push does no harm. */
const spare = 2e-4;

/**
 * Pushes discs that come too close apart, each half of the way and back into the box, until none do
 * or it has gone on for long enough. Changes the middles.
 * @returns by how much the discs still come too close, all pairs together, in mm; 0 where they fit
 */
export function pushApart(discs: Middles, box: DiscBox): number {
  const wanted = box.apart + spare;
  let pairs = nearPairs(discs, wanted * 1.35);
  let left = Infinity;
  for (let sweep = 0; sweep < sweeps; sweep += 1) {
    if (sweep % 25 === 24) pairs = nearPairs(discs, wanted * 1.35);
    left = sweepOnce(discs, box, pairs, wanted);
    if (left < spare / 4) return tooClose(discs, box.apart) ? left : 0;
  }
  return left;
}

function sweepOnce({ x, y }: Middles, box: DiscBox, pairs: Int32Array, wanted: number): number {
  let left = 0;
  for (let at = 0; at < pairs.length; at += 2) {
    const [i, j] = [pairs[at] as number, pairs[at + 1] as number];
    const dx = (x[j] as number) - (x[i] as number);
    const dy = (y[j] as number) - (y[i] as number);
    const square = dx * dx + dy * dy;
    if (square >= wanted * wanted) continue;
    const distance = Math.sqrt(square);
    left += wanted - distance;
    const by = (0.5 * (wanted - distance)) / (distance || 1e-9);
    x[i] = within((x[i] as number) - dx * by, box.width);
    y[i] = within((y[i] as number) - dy * by, box.height);
    x[j] = within((x[j] as number) + dx * by, box.width);
    y[j] = within((y[j] as number) + dy * by, box.height);
  }
  return left;
}

export const within = (value: number, most: number): number => Math.min(most, Math.max(0, value));

/** The pairs that are nearer than a reach, as indices one after the other. */
function nearPairs({ x, y }: Middles, reach: number): Int32Array {
  const order = Array.from(x.keys()).sort((a, b) => (x[a] as number) - (x[b] as number));
  const pairs: number[] = [];
  for (let at = 0; at < order.length; at += 1) {
    const i = order[at] as number;
    for (let next = at + 1; next < order.length; next += 1) {
      const j = order[next] as number;
      if ((x[j] as number) - (x[i] as number) >= reach) break;
      if (Math.abs((y[j] as number) - (y[i] as number)) < reach) pairs.push(i, j);
    }
  }
  return Int32Array.from(pairs);
}

function tooClose(discs: Middles, apart: number): boolean {
  const { x, y } = discs;
  const pairs = nearPairs(discs, apart);
  for (let at = 0; at < pairs.length; at += 2) {
    const [i, j] = [pairs[at] as number, pairs[at + 1] as number];
    const distance = Math.hypot(
      (x[i] as number) - (x[j] as number),
      (y[i] as number) - (y[j] as number),
    );
    if (distance < apart) return true;
  }
  return false;
}
