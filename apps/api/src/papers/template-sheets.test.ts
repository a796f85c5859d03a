import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { overlap, tilingFor } from './template-sheets.ts';

describe('the sheets of a template', () => {
  it('cover the whole drawing, overlap, and are no more than it needs', () => {
    const side = fc.double({ min: 2, max: 5010, noNaN: true });
    fc.assert(
      fc.property(side, side, fc.constantFrom('a4', 'letter'), (width, height, name) => {
        const { tiles, window, columns, rows } = tilingFor({ width, height }, name);
        expect(tiles).toHaveLength(columns * rows);
        expect(tiles.length).toBeLessThanOrEqual(24);
        const xs = tiles.slice(0, columns).map(({ x }) => x);
        const ys = tiles.filter(({ column }) => column === 0).map(({ y }) => y);
        for (const [starts, reach, whole] of [
          [xs, window.width, width],
          [ys, window.height, height],
        ] as const) {
          expect(starts[0]).toBeLessThanOrEqual(1e-6);
          expect((starts.at(-1) ?? 0) + reach).toBeGreaterThanOrEqual(whole - 1e-6);
          starts.slice(1).forEach((start, at) => {
            expect((starts[at] ?? 0) + reach - start).toBeCloseTo(overlap, 6);
          });
          if (starts.length > 1) {
            const fewer = (starts.length - 1) * (reach - overlap) + overlap;
            expect(fewer).toBeLessThan(whole);
          }
        }
      }),
    );
  });

  it('are one, upright or across, where it fits', () => {
    expect(tilingFor({ width: 100, height: 100 }, 'a4')).toMatchObject({ columns: 1, rows: 1 });
    const across = tilingFor({ width: 260, height: 100 }, 'a4');
    expect(across).toMatchObject({ columns: 1, rows: 1, sheet: { width: 297, height: 210 } });
    expect(tilingFor({ width: 300, height: 300 }, 'letter').tiles.length).toBeGreaterThan(1);
  });

  it('become one page as large as it needs where there would be more than 24', () => {
    const { tiles, sheet } = tilingFor({ width: 3000, height: 2000 }, 'a4');
    expect(tiles).toHaveLength(1);
    expect(sheet.width).toBeGreaterThan(3000);
  });
});
