import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { type DrawnSide, usualSide } from '../leather/drawn-side.ts';
import { nestFaults } from '../nest/nest-faults.ts';
import type { Outline } from '../outline/outline.ts';
import { ringBounds } from '../outline/ring.ts';
import { layOutSide } from './lay-out.ts';
import type { SideInput, SideLayout } from './layout.ts';
import { sideProblem } from './nest-problem.ts';
import { placedRing } from './placed-ring.ts';

const luggageTag: Outline = {
  shape: 'tag',
  lengthMm: 100,
  widthMm: 50,
  neckLengthMm: 40,
  neckWidthMm: 20,
  cornerRadiusMm: 6,
};
const round: Outline = { shape: 'round', diameterMm: 95 };
const card: Outline = { shape: 'rectangle', widthMm: 140, heightMm: 90, cornerRadiusMm: 4 };

const roundFlaw = (x: number, y: number, radius = 30) =>
  Array.from({ length: 12 }, (_, at) => ({
    x: x + radius * Math.cos((at * Math.PI) / 6),
    y: y + radius * Math.sin((at * Math.PI) / 6),
  }));

/** Says which pieces come nearer to a cut than the trim, and what of the strips does not add up. */
function cutFaults({ outline, trimMm, widestMm = 0 }: SideInput, layout: SideLayout): string[] {
  const { along, at, strips } = layout.cuts ?? { along: 'width', at: [], strips: [] };
  const spans = layout.placements.map((placement) => {
    const { minX, maxX, minY, maxY } = ringBounds(placedRing(outline, placement));
    return along === 'width' ? [minY, maxY] : [minX, maxX];
  });
  const tooNear = spans.flatMap(([low = 0, high = 0], piece) =>
    at.some((cut) => low < cut + trimMm - 1e-3 && high > cut - trimMm + 1e-3)
      ? [`piece ${piece} is too near a cut`]
      : [],
  );
  const tooWide = strips.filter(({ widthMm }) => widthMm > widestMm + 1e-3);
  const pieces = strips.reduce((sum, strip) => sum + strip.pieces, 0);
  return [
    ...tooNear,
    ...(layout.pieces > 0 ? tooWide.map(({ widthMm }) => `a strip is ${widthMm} mm wide`) : []),
    ...(pieces === layout.pieces ? [] : [`the strips hold ${pieces} of ${layout.pieces}`]),
  ];
}

describe('a side cut into strips', { timeout: 300_000 }, () => {
  const side = {
    outline: usualSide(2_229_673),
    flaws: [roundFlaw(600, 300), roundFlaw(1200, 500), roundFlaw(1700, 250, 15)],
  };
  const input = { outline: luggageTag, spacingMm: 2, trimMm: 4, side, widestMm: 300 };

  it('gives all but as many pieces as the whole side, none of them across a cut', () => {
    const layout = layOutSide(input);
    expect(nestFaults(sideProblem(input), layout.placements)).toEqual([]);
    expect(cutFaults(input, layout)).toEqual([]);
    const { widestMm: _widest, ...left } = input;
    expect(layout.pieces).toBeGreaterThan(0.85 * layOutSide(left).pieces);
    expect(layout.pieces).toBeLessThanOrEqual(layout.boundPieces ?? 0);
  });

  it('needs no cut where the press takes it whole', () => {
    const { cuts, pieces } = layOutSide({ ...input, widestMm: 20_000 });
    expect(cuts?.at).toEqual([]);
    expect(cuts?.strips).toMatchObject([{ pieces }]);
  });

  it('lays the same rows in every strip, all strips between two cuts of one width', () => {
    const { cuts, pitchMm, piecesPerRow } = layOutSide({ ...input, outline: round });
    const inner = cuts?.strips.slice(1, -1).map(({ widthMm }) => widthMm) ?? [];
    expect(inner.length).toBeGreaterThan(1);
    for (const width of inner) expect(width).toBeCloseTo(inner[0] ?? 0, 3);
    expect(pitchMm).toBeGreaterThanOrEqual(97 - 1e-3);
    expect(piecesPerRow).toBeGreaterThan(3);
  });

  it('fills a rectangle that takes whole rows exactly', () => {
    // Cards of 140 × 90 upright in strips of 288: two rows of them, 10 along each 944.
    const outline = [
      { x: 0, y: 0 },
      { x: 0, y: 1152 },
      { x: 944, y: 1152 },
      { x: 944, y: 0 },
    ];
    const asked = { ...input, outline: card, spacingMm: 0, side: { outline, flaws: [] } };
    const layout = layOutSide({ ...asked, turns: 'quarter turns', widestMm: 288 });
    expect(cutFaults({ ...asked, widestMm: 288 }, layout)).toEqual([]);
    expect(layout.pieces).toBeGreaterThanOrEqual(80);
  });

  it('has no cuts where nothing fits', () => {
    const narrow = layOutSide({ ...input, widestMm: 30 });
    expect(narrow).toMatchObject({ pieces: 0, placements: [], cuts: { at: [] } });
    const flawed = { ...side, flaws: [side.outline] };
    expect(layOutSide({ ...input, side: flawed })).toMatchObject({ pieces: 0, cuts: { at: [] } });
  });

  it('is left whole where no width is asked for, and refuses a width of nothing', () => {
    const { widestMm: _widest, ...whole } = input;
    expect(layOutSide(whole).cuts).toBeNull();
    expect(() => layOutSide({ ...input, widestMm: 0 })).toThrow('Write the widest strip');
  });

  it('keeps inside, off the flaws and off the cuts, whatever is drawn, and always alike', () => {
    const aSide: fc.Arbitrary<DrawnSide> = fc
      .record({
        corners: fc.array(fc.integer({ min: 260, max: 480 }), { minLength: 8, maxLength: 14 }),
        flaws: fc.array(
          fc.tuple(fc.integer({ min: 250, max: 700 }), fc.integer({ min: 250, max: 700 })),
          {
            maxLength: 3,
          },
        ),
      })
      .map(({ corners, flaws }) => ({
        outline: corners.map((radius, at) => ({
          x: 480 + radius * Math.cos((2 * Math.PI * at) / corners.length),
          y: 480 + radius * Math.sin((2 * Math.PI * at) / corners.length),
        })),
        flaws: flaws.map(([x, y]) => roundFlaw(x, y, 25)),
      }));
    fc.assert(
      fc.property(
        aSide,
        fc.constantFrom<Outline>(luggageTag, round, card),
        fc.constantFrom(0, 2),
        fc.constantFrom(0, 5),
        fc.integer({ min: 120, max: 420 }),
        fc.constantFrom<SideInput['turns'] & string>('with the spine', 'quarter turns', 'free'),
        (drawn, outline, spacingMm, trimMm, widestMm, turns) => {
          const asked = { outline, spacingMm, trimMm, widestMm, turns, side: drawn };
          const layout = layOutSide(asked);
          expect(nestFaults(sideProblem(asked), layout.placements)).toEqual([]);
          expect(cutFaults(asked, layout)).toEqual([]);
          expect(layOutSide(asked)).toEqual(layout);
        },
      ),
      { numRuns: 15, seed: 7 },
    );
  });
});
