/** Sizes in whole numbers; the piece is at least as long as wide. */
export interface WholeSizes {
  width: number;
  height: number;
  long: number;
  short: number;
}

/** What a length is allowed to miss, in mm: far below what is checked, above what arithmetic loses. */
export const slackMm = 1e-6;

const largestLong = 200;

/**
 * The smallest whole sizes that behave the same: on both sides of the container the same numbers of
 * long and short sides fit in a row. Layouts of one are layouts of the other, and the fewer places
 * a piece can have, the shorter the search. Where there are none up to a piece of 200, sizes are
 * rounded against the pieces, which may lose a layout but never gives a wrong one.
 * Source: the idea of equivalent classes of instances, K. A. Dowsland, "The three-dimensional
 * pallet chart" (1984), from memory.
 */
export function smallestAlike(
  width: number,
  height: number,
  long: number,
  short: number,
): WholeSizes {
  const sides = [rowsThatFit(width, long, short), rowsThatFit(height, long, short)] as const;
  for (let wholeLong = 1; wholeLong <= largestLong; wholeLong += 1) {
    for (let wholeShort = 1; wholeShort <= wholeLong; wholeShort += 1) {
      const wholeWidth = sideAlike(sides[0], wholeLong, wholeShort);
      if (wholeWidth === 0) continue;
      const wholeHeight = sideAlike(sides[1], wholeLong, wholeShort);
      if (wholeHeight === 0) continue;
      return { width: wholeWidth, height: wholeHeight, long: wholeLong, short: wholeShort };
    }
  }
  const scale = 1000 / Math.max(width, height);
  return {
    width: Math.floor((width + slackMm) * scale),
    height: Math.floor((height + slackMm) * scale),
    long: Math.ceil(long * scale - slackMm),
    short: Math.ceil(short * scale - slackMm),
  };
}

/** For 0, 1, 2 … long sides in a row: how many short ones fit beside them. */
function rowsThatFit(side: number, long: number, short: number): number[] {
  const longs = Math.floor((side + slackMm) / long);
  return Array.from({ length: longs + 1 }, (_, count) =>
    Math.floor((side + slackMm - count * long) / short),
  );
}

/** The whole side on which exactly the same rows fit; 0 where there is none. */
function sideAlike(most: readonly number[], long: number, short: number): number {
  let side = 0;
  let least = most.length * long;
  for (let longs = 0; longs < most.length; longs += 1) {
    const row = longs * long + (most[longs] as number) * short;
    side = Math.max(side, row);
    least = Math.min(least, row + short);
  }
  return least > side ? side : 0;
}
