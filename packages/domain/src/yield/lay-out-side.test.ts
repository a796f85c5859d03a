import { describe, expect, it } from 'vitest';
import { usualSide } from '../leather/drawn-side.ts';
import { nestFaults } from '../nest/nest-faults.ts';
import type { Outline } from '../outline/outline.ts';
import { layOutSide } from './lay-out.ts';
import { sideProblem } from './nest-problem.ts';

const luggageTag: Outline = {
  shape: 'tag',
  lengthMm: 100,
  widthMm: 50,
  neckLengthMm: 40,
  neckWidthMm: 20,
  cornerRadiusMm: 6,
};

describe('a layout on a side', { timeout: 300_000 }, () => {
  const side = {
    outline: usualSide(1_500_000),
    flaws: [roundFlaw(600, 300), roundFlaw(1200, 500)],
  };
  const input = { outline: luggageTag, spacingMm: 2, trimMm: 4, side };

  it('keeps off edge and flaws, and the turns that are allowed', () => {
    const layout = layOutSide({ ...input, turns: 'with the spine' });
    expect(nestFaults(sideProblem(input), layout.placements)).toEqual([]);
    expect(layout.pieces).toBeGreaterThan(200);
    expect(layout.pieces).toBeLessThanOrEqual(layout.boundPieces ?? 0);
    expect(layout.placements.every(({ rot }) => rot % 180 === 0)).toBe(true);
  });

  it('gives nothing where flaws cover it', () => {
    const layout = layOutSide({ ...input, side: { ...side, flaws: [side.outline] } });
    expect(layout).toMatchObject({ pieces: 0, areaPerPieceMm2: null });
  });

  it('refuses an edge that crosses itself, naming the place', () => {
    const outline = [
      { x: 0, y: 0 },
      { x: 900, y: 900 },
      { x: 900, y: 0 },
      { x: 0, y: 900 },
    ];
    expect(() => layOutSide({ ...input, side: { outline, flaws: [] } })).toThrow(
      'crosses itself near x 450, y 450 mm',
    );
  });
});

function roundFlaw(x: number, y: number) {
  return Array.from({ length: 12 }, (_, at) => ({
    x: x + 30 * Math.cos((at * Math.PI) / 6),
    y: y + 30 * Math.sin((at * Math.PI) / 6),
  }));
}
