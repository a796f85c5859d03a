import { describe, expect, it } from 'vitest';
import { layOut } from './lay-out.ts';
import type { LayoutInput } from './layout.ts';
import { stripCuts } from './strip-cuts.ts';

const panel = { form: 'panel' as const, widthMm: 400, heightMm: 500 };
const input: LayoutInput = {
  outline: { shape: 'rectangle', widthMm: 90, heightMm: 60, cornerRadiusMm: 0 },
  spacingMm: 2,
  trimMm: 3,
  container: panel,
  turns: 'with the spine',
};
const layout = layOut(input);

describe('stripCuts', () => {
  it('parts a panel between its rows, with as few cuts as do', () => {
    const cuts = stripCuts(panel, layout.placements, input.outline, 300);
    expect(cuts?.at).toHaveLength(1);
    expect(Math.max(...(cuts?.widths ?? []))).toBeLessThanOrEqual(300);
    expect(cuts?.widths.reduce((sum, width) => sum + width, 0)).toBeCloseTo(
      cuts?.along === 'width' ? 500 : 400,
      6,
    );
    const across = cuts?.along === 'width' ? 'y' : 'x';
    const half = cuts?.along === 'width' ? 30 : 45;
    for (const at of cuts?.at ?? []) {
      for (const piece of layout.placements) {
        expect(Math.abs(piece[across] - at)).toBeGreaterThanOrEqual(half - 1e-6);
      }
    }
  });

  it('cuts nothing that goes in whole, and gives up where every cut runs through a piece', () => {
    expect(stripCuts(panel, layout.placements, input.outline, 400)).toBeNull();
    expect(stripCuts(panel, layout.placements, input.outline, 40)).toBeNull();
  });
});
