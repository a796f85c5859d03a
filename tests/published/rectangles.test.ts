import { packRectangles } from '@hidewright/domain';
import { describe, expect, it } from 'vitest';

/**
 * Panel length and width, piece length and width, the most pieces. The problem and its size:
 * G. H. A. Martins and R. F. Dell, "Solving the pallet loading problem", European Journal of
 * Operational Research 184 (2008) 429–440. The most pieces, recomputed: above, the bound of Barnes
 * (1979) and the area; below, recursive five-block layouts (Morabito and Morales 1998) or an
 * exhaustive search along the skyline.
 */
type Instance = [length: number, width: number, long: number, short: number, most: number];

const small: Instance[] = [
  [3, 3, 2, 1, 4],
  [5, 5, 2, 1, 12],
  [5, 5, 3, 2, 4],
  [7, 5, 3, 2, 5],
  [8, 8, 5, 3, 4],
  [10, 10, 4, 3, 8],
  [13, 10, 5, 3, 8],
  [14, 10, 4, 3, 11],
  [16, 11, 5, 3, 11],
  [20, 15, 7, 4, 10],
  [22, 16, 5, 3, 23],
  [1200, 800, 300, 200, 16],
];

const medium: Instance[] = [
  [30, 22, 7, 4, 23],
  [36, 26, 7, 4, 33],
  [50, 36, 11, 7, 23],
  [42, 39, 9, 4, 45],
  [40, 25, 7, 3, 47],
  [52, 33, 9, 4, 47],
  [57, 44, 12, 5, 41],
  [86, 82, 15, 11, 42],
  [124, 81, 21, 10, 47],
];

/** One more would fit by area, and was proved impossible. */
const belowArea: Instance[] = [
  [24, 18, 7, 5, 11],
  [32, 22, 5, 4, 34],
  [34, 23, 5, 4, 38],
  [48, 36, 10, 7, 23],
  [120, 80, 32, 26, 10],
  [120, 100, 29, 19, 20],
];

/**
 * Left open by five-block recursion: L. Lins, S. Lins and R. Morabito, "An L-approach for packing
 * (l, w)-rectangles into rectangular and L-shaped pieces", Journal of the Operational Research
 * Society 54 (2003); E. G. Birgin, R. Morabito and F. H. Nishihara, the same journal 56 (2005); both
 * from memory.
 */
const hard: Instance[] = [
  [43, 26, 7, 3, 53],
  [49, 28, 8, 3, 57],
  [57, 34, 7, 4, 69],
  [63, 44, 8, 5, 69],
  [61, 35, 10, 3, 71],
  [67, 37, 11, 3, 75],
  [67, 40, 11, 3, 81],
  [61, 38, 10, 3, 77],
  [61, 38, 6, 5, 77],
  [93, 46, 13, 4, 82],
  [106, 59, 13, 5, 96],
  [141, 71, 13, 8, 96],
];

describe('identical rectangles in a rectangle', () => {
  it.each([...small, ...medium, ...belowArea, ...hard])(
    'on %i × %i of %i × %i are %i, and no cell is covered twice',
    (width, height, long, short, most) => {
      const piece = { width: long, height: short };
      const { pieces, bound } = packRectangles({ width, height }, piece);
      const cells = new Uint8Array(width * height);
      for (const { x, y, turned } of pieces) {
        const [wide, high] = turned ? [short, long] : [long, short];
        expect([x + wide <= width, y + high <= height]).toEqual([true, true]);
        for (let row = y; row < y + high; row += 1) {
          for (let column = x; column < x + wide; column += 1) {
            cells[row * width + column] = (cells[row * width + column] ?? 0) + 1;
          }
        }
      }
      expect(pieces).toHaveLength(most);
      expect(bound).toBeGreaterThanOrEqual(most);
      expect(Math.max(...new Set(cells))).toBe(1);
      expect(cells.reduce((sum, covered) => sum + covered, 0)).toBe(most * long * short);
    },
  );
});
