import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { labelPages, labelSpots, type LabelGrid } from './label-grid.ts';

const grid: LabelGrid = {
  page: 'a4',
  columns: 2,
  rows: 5,
  widthMm: 90,
  heightMm: 50,
  leftMm: 12,
  topMm: 20,
  gapAcrossMm: 6,
  gapDownMm: 2,
};

describe('where labels lie', () => {
  it('is row by row from the first, and on the next sheet after the last', () => {
    const spots = labelSpots(grid, 11, 1);
    expect(spots.slice(0, 3)).toEqual([
      { sheet: 0, xMm: 12, yMm: 20 },
      { sheet: 0, xMm: 108, yMm: 20 },
      { sheet: 0, xMm: 12, yMm: 72 },
    ]);
    expect(spots[10]).toEqual({ sheet: 1, xMm: 12, yMm: 20 });
  });

  it('begins at any label of a sheet that was begun', () => {
    expect(labelSpots(grid, 1, 4)).toEqual([{ sheet: 0, xMm: 108, yMm: 72 }]);
    expect(labelSpots(grid, 2, 10).map(({ sheet }) => sheet)).toEqual([0, 1]);
    for (const start of [0, 11]) expect(() => labelSpots(grid, 1, start)).toThrow(/10 labels/);
  });

  it('is refused where the sheet is too small', () => {
    expect(() => labelSpots({ ...grid, columns: 3 }, 1, 1)).toThrow(/need 294 mm.*210 mm/);
    expect(() => labelSpots({ ...grid, rows: 6 }, 1, 1)).toThrow(/need 330 mm.*297 mm/);
  });

  it('is on the sheet, and no two on one spot', () => {
    const sizes = fc.integer({ min: 10, max: 60 });
    const counts = fc.integer({ min: 1, max: 3 });
    fc.assert(
      fc.property(sizes, sizes, counts, counts, fc.nat({ max: 40 }), (w, h, columns, rows, n) => {
        const any = { ...grid, widthMm: w, heightMm: h, columns, rows };
        const spots = labelSpots(any, n, 1);
        for (const { xMm, yMm } of spots) {
          expect(xMm + w).toBeLessThanOrEqual(labelPages.a4.widthMm);
          expect(yMm + h).toBeLessThanOrEqual(labelPages.a4.heightMm);
        }
        expect(new Set(spots.map((spot) => JSON.stringify(spot))).size).toBe(n);
      }),
    );
  });
});
