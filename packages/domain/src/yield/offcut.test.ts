import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { Point } from '../outline/outline.ts';
import { largestOffcut } from './offcut.ts';

const rectangle = (x: number, y: number, width: number, height: number): Point[] => [
  { x, y },
  { x: x + width, y },
  { x: x + width, y: y + height },
  { x, y: y + height },
];

describe('largestOffcut', () => {
  it('is the whole panel where nothing is cut', () => {
    expect(largestOffcut(rectangle(0, 0, 400, 200), [])).toEqual({
      x: 0,
      y: 0,
      widthMm: 400,
      heightMm: 200,
    });
  });

  it('is what lies beyond the pieces', () => {
    const pieces = [rectangle(0, 0, 100, 200), rectangle(100, 0, 100, 200)];
    expect(largestOffcut(rectangle(0, 0, 400, 200), pieces)).toEqual({
      x: 200,
      y: 0,
      widthMm: 200,
      heightMm: 200,
    });
  });

  it('goes around a flaw', () => {
    const found = largestOffcut(rectangle(0, 0, 400, 200), [rectangle(290, 90, 20, 20)]);
    expect(found).toEqual({ x: 0, y: 0, widthMm: 290, heightMm: 200 });
  });

  it('is nothing where only slivers are left', () => {
    expect(largestOffcut(rectangle(0, 0, 400, 200), [rectangle(0, 0, 390, 200)])).toBeNull();
  });

  it('is never larger than what is left, and never over a piece', () => {
    const piece = fc.record({
      x: fc.integer({ min: -50, max: 380 }),
      y: fc.integer({ min: -50, max: 280 }),
      width: fc.integer({ min: 1, max: 200 }),
      height: fc.integer({ min: 1, max: 200 }),
    });
    fc.assert(
      fc.property(fc.array(piece, { maxLength: 8 }), (pieces) => {
        const taken = pieces.map(({ x, y, width, height }) => rectangle(x, y, width, height));
        const found = largestOffcut(rectangle(0, 0, 400, 300), taken);
        if (found === null) return;
        expect(found.x).toBeGreaterThanOrEqual(0);
        expect(found.x + found.widthMm).toBeLessThanOrEqual(400);
        expect(found.y + found.heightMm).toBeLessThanOrEqual(300);
        for (const { x, y, width, height } of pieces) {
          const across = Math.min(found.x + found.widthMm, x + width) - Math.max(found.x, x);
          const down = Math.min(found.y + found.heightMm, y + height) - Math.max(found.y, y);
          expect(Math.min(across, down)).toBeLessThan(1e-6);
        }
      }),
      { numRuns: 60 },
    );
  });
});
