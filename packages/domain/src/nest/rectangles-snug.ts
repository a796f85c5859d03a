import { box, type Ell, mirrored, type Places } from './rectangles-cuts.ts';

/** For every length the longest row of long and short sides in it. */
export function fullRows(largest: number, long: number, short: number): Int32Array {
  const row = new Int32Array(largest + 1);
  for (let side = 1; side <= largest; side += 1) {
    const withLong = side >= long ? (row[side - long] as number) + long : 0;
    const withShort = side >= short ? (row[side - short] as number) + short : 0;
    row[side] = Math.max(withLong, withShort);
  }
  return row;
}

/**
 * Raster points: as long as the longest row that fits beside some other row. Source: J. Terno,
 * R. Lindemann and G. Scheithauer, "Zuschnittprobleme und ihre praktische Lösung" (1987), from memory.
 */
export function cuttingPlaces(row: Int32Array): Places {
  const known = new Map<number, readonly number[]>();
  return (side) => {
    let places = known.get(side);
    if (!places) {
      const left = Array.from(
        { length: side },
        (_, at) => row[side - (row[at] as number)] as number,
      );
      places = [...new Set(left)].filter((at) => at > 0 && at < side).sort((a, b) => a - b);
      known.set(side, places);
    }
    return places;
  };
}

/** No wider or higher than full rows of pieces need; null where none fits. */
export function snugly(ell: Ell, row: Int32Array): Ell | null {
  const [width, height, armWidth, armHeight] = [
    row[ell.width] as number,
    row[ell.height] as number,
    row[ell.armWidth] as number,
    row[ell.armHeight] as number,
  ];
  if (width === 0 || height === 0) return null;
  if (armWidth >= width || armHeight >= height) return box(width, height);
  if (armWidth === 0) return armHeight === 0 ? null : box(width, armHeight);
  if (armHeight === 0) return box(armWidth, height);
  return { width, height, armWidth, armHeight };
}

/** Whether the other of the two mirror images is the one that is kept. */
export const isMirrored = ({ width, height, armWidth, armHeight }: Ell): boolean =>
  height > width || (height === width && armHeight > armWidth);

/** The one of its two mirror images that is kept. */
export const inOrder = (ell: Ell): Ell => (isMirrored(ell) ? mirrored(ell) : ell);
