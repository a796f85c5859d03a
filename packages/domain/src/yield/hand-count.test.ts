import { describe, expect, it } from 'vitest';
import { handCount } from './hand-count.ts';
import { layoutInputKey } from './layout-input-key.ts';

describe('a hand count', () => {
  it('knows its panel and the leather that a piece takes, and has no picture', () => {
    const layout = handCount({ pieces: 21, widthMm: 279.4, heightMm: 330.2 });
    expect(layout).toMatchObject({
      by: 'hand count',
      pieces: 21,
      placements: [],
      containerAreaMm2: '92257.88',
      areaPerPieceMm2: '4393.232',
      boundPieces: null,
    });
  });

  it.each([
    ['pieces', { pieces: 0 }],
    ['pieces', { pieces: 2.5 }],
    ['widthMm', { widthMm: 0 }],
    ['heightMm', { heightMm: Number.NaN }],
  ])('refuses %s that make no sense', (field, change) => {
    expect(() => handCount({ pieces: 21, widthMm: 279.4, heightMm: 330.2, ...change })).toThrow(
      expect.objectContaining({ field }),
    );
  });
});

describe('the key of a layout', () => {
  const outline = { shape: 'round' as const, diameterMm: 95 };
  const container = { form: 'panel' as const, widthMm: 300, heightMm: 600 };

  it('does not depend on the order of fields, only on their values', () => {
    const key = layoutInputKey({ outline, container, spacingMm: 3, trimMm: 5 });
    const turned = { heightMm: 600, widthMm: 300, form: 'panel' as const };
    expect(layoutInputKey({ trimMm: 5, spacingMm: 3, container: turned, outline })).toBe(key);
    expect(layoutInputKey({ outline, container, spacingMm: 5, trimMm: 3 })).not.toBe(key);
  });
});
