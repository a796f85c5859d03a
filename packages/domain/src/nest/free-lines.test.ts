import { describe, expect, it } from 'vitest';
import { FreeLines } from './free-lines.ts';
import type { Ring } from './problem.ts';

const box = (x: number, y: number, w: number, h: number): Ring => [
  { x, y },
  { x: x + w, y },
  { x: x + w, y: y + h },
  { x, y: y + h },
];

describe('FreeLines', () => {
  // A box of 100 × 50 with a square flaw from 40 to 60 along, 20 to 30 across.
  const free = [box(0, 0, 100, 50), [...box(40, 20, 20, 10)].reverse()];
  const lines = new FreeLines(() => free);
  const every30 = { periodMm: 30, pieces: [{ x: 5, y: 10, rot: 0 }] };

  it('counts the repeats on a line that a flaw leaves free', () => {
    // 0 to 100 takes four places 30 apart, 0 to 40 and 60 to 100 two each only as far as they are in step.
    expect(lines.best(every30, 0).count).toBe(4);
    expect(lines.best(every30, 15).count).toBe(4);
    expect(lines.best({ ...every30, periodMm: 21 }, 15).count).toBe(4);
    expect(lines.best(every30, 100)).toMatchObject({ count: 0 });
  });

  it('puts as many pieces as it counted, each in the room', () => {
    for (const periodMm of [7, 13, 21, 33.3]) {
      for (const base of [0, 12, 15, 38]) {
        const cell = { periodMm, pieces: [...every30.pieces, { x: 1, y: 2, rot: 180 }] };
        const { count, u } = lines.best(cell, base);
        const placements = lines.placements(cell, base, u);
        expect(placements).toHaveLength(count);
        for (const { x, y } of placements) {
          expect(x).toBeGreaterThanOrEqual(0);
          expect(x).toBeLessThanOrEqual(100);
          expect(y > 20 && y < 30 && x > 40 && x < 60).toBe(false);
        }
      }
    }
  });
});
