import { layOut, type Outline } from '@hidewright/domain';
import { describe, expect, it } from 'vitest';

const round = (diameterMm: number): Outline => ({ shape: 'round', diameterMm });

describe('round pieces in rows', () => {
  // Square rows and hexagonal rows in a finite rectangle, by their counting formulas, recomputed:
  // floor(L/d) · floor(W/d) and ceil(r/2) n1 + floor(r/2) n2. The better one is the least to expect.
  // Upper bound: Groemer 1960 / Oler 1961 (from memory), (2/√3) A/d² + P/(2d) + 1 of the centres' room.
  it.each([
    [100, 100, 10, 105],
    [50, 50, 10, 25],
    [70, 70, 10, 49],
    [80, 80, 10, 68],
    [200, 100, 10, 215],
    [300, 200, 25, 104],
    [300, 200, 30, 67],
    [600, 300, 38, 126],
    [100, 20, 10, 20],
    [120, 120, 50, 4],
    [1000, 300, 50, 121],
  ])(
    'from %i × %i mm, %i mm across, are at least as many as by formula',
    (widthMm, heightMm, d, least) => {
      const container = { form: 'panel' as const, widthMm, heightMm };
      const { pieces } = layOut({ outline: round(d), spacingMm: 0, trimMm: 0, container });
      const [a, b] = [widthMm - d, heightMm - d];
      const most = Math.floor(((2 / Math.sqrt(3)) * a * b) / (d * d) + (a + b) / d + 1 + 1e-9);
      expect(pieces).toBeGreaterThanOrEqual(least);
      expect(pieces).toBeLessThanOrEqual(most);
    },
  );

  // Füredi, "The densest packing of equal circles into a parallel strip", Discrete & Computational
  // Geometry 6 (1991), from memory: two rows in a strip of d (1 + √3/2) need d/2 per piece.
  it('need half a diameter each in a strip for two rows', () => {
    const container = { form: 'strip' as const, widthMm: 10 * (1 + Math.sqrt(3) / 2) };
    const layout = layOut({ outline: round(10), spacingMm: 0, trimMm: 0, container });
    expect(layout.mmPerPiece).toBeCloseTo(5, 3);
  });
});
