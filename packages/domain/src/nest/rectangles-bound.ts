import type { Ell } from './rectangles-cuts.ts';

/**
 * The area, in cells, that every packing of bars 1 × n leaves empty. Cells are coloured in n colours
 * along the diagonals, once each way: every bar covers one cell of each colour, so the rarest colour
 * counts the bars. Source: F. W. Barnes, "Packing the maximum number of m × n tiles in a large p × q
 * rectangle", Discrete Mathematics 26 (1979), from memory, here for an L as well.
 */
export function emptyCells({ width, height, armWidth, armHeight }: Ell, bar: Diagonals): number {
  const { n } = bar;
  const [cutX, cutY] = [width - armWidth, height - armHeight];
  const whole = bar.leftover(width % n, height % n);
  const missing = bar.leftover(cutX % n, cutY % n);
  const [up, down] = [(armWidth + armHeight) % n, armWidth % n];
  let rarest = Infinity;
  for (let colour = 0; colour < n; colour += 1) {
    const cells = whole[colour] as number;
    const upwards = cells - (missing[(colour - up + n) % n] as number);
    const downwards = cells - (missing[(colour - down + n) % n] as number);
    rarest = Math.min(rarest, upwards, downwards);
  }
  const even = (a: number, b: number) => (a * b - (a % n) * (b % n)) / n;
  const bars = even(width, height) - even(cutX, cutY) + rarest;
  return width * height - cutX * cutY - n * bars;
}

/** How often each diagonal colour comes in what is left of a rectangle beyond multiples of n. */
export interface Diagonals {
  n: number;
  leftover: (width: number, height: number) => Int32Array;
}

export function diagonals(n: number): Diagonals {
  const known = new Map<number, Int32Array>();
  const leftover = (width: number, height: number): Int32Array => {
    const key = width * n + height;
    const counts = known.get(key) ?? count(n, width, height);
    known.set(key, counts);
    return counts;
  };
  return { n, leftover };
}

function count(n: number, width: number, height: number): Int32Array {
  const counts = new Int32Array(n);
  for (let x = 0; x < width; x += 1) {
    for (let y = 0; y < height; y += 1) {
      const colour = (x + y) % n;
      counts[colour] = (counts[colour] as number) + 1;
    }
  }
  return counts;
}
