import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import {
  areaForPieces,
  type CutFrom,
  type LotToCut,
  piecesFromLot,
  usableArea,
} from './pieces-from-lot.ts';

const mm2 = (area: number): number => area * 1000;

/** A panel of 300 × 400 mm gives twelve. */
const cut: CutFrom = { pieces: 12, areaMm2: '120000', sides: { widthMm: 300, heightMm: 400 } };
const side: LotToCut = {
  freeArea: mm2(2_000_000),
  measuredArea: mm2(2_000_000),
  usablePercent: 85,
  panel: null,
  drawnArea: null,
};

describe('piecesFromLot', () => {
  it('cuts whole panels from the usable share of a side', () => {
    // 1,700,000 mm² are usable: 14 panels of 120,000.
    expect(piecesFromLot(side, cut)).toMatchObject({ pieces: 168, by: 'area' });
    expect(areaForPieces(side, piecesFromLot(side, cut), 13)).toBe(mm2(240_000));
  });

  it('takes what is gone off the usable share, so that nothing is cut twice', () => {
    expect(piecesFromLot({ ...side, freeArea: mm2(1_000_000) }, cut).pieces).toBe(5 * 12);
    expect(piecesFromLot({ ...side, freeArea: mm2(300_000) }, cut).pieces).toBe(0);
  });

  it('trusts a layout on the side as drawn, in proportion to what is free', () => {
    expect(piecesFromLot(side, cut, 150)).toMatchObject({ pieces: 150, by: 'layout' });
    const half = { ...side, freeArea: mm2(1_000_000) };
    expect(piecesFromLot(half, cut, 151).pieces).toBe(75);
    expect(piecesFromLot(side, cut, 0).pieces).toBe(0);
  });

  it('leaves out flaws where the side is drawn and not laid out', () => {
    expect(piecesFromLot({ ...side, drawnArea: mm2(1_250_000) }, cut).pieces).toBe(10 * 12);
  });

  it('counts ready panels whole, either way round, and two from a double one', () => {
    const bundle = { ...side, panel: { widthMm: 400, heightMm: 300 }, freeArea: mm2(1_000_000) };
    expect(piecesFromLot(bundle, cut)).toMatchObject({ pieces: 8 * 12, by: 'panels' });
    const double = { ...bundle, panel: { widthMm: 410, heightMm: 610 } };
    // 2,000,000 mm² typed for eight of 250,100.
    expect(piecesFromLot(double, cut)).toMatchObject({ pieces: 4 * 24, perUnit: 24 });
  });

  it('goes by how many panels somebody counted, whatever area was typed for all of them', () => {
    const panel = { widthMm: 279.4, heightMm: 330.2 };
    const eleven = { pieces: 21, areaMm2: '92257.88', sides: panel };
    const typed = (footage: number, panels: number): LotToCut => {
      const area = mm2(Math.round(footage * 92_903.04));
      return { ...side, freeArea: area, measuredArea: area, panel, panels };
    };
    // Ten panels of 9.9306 ft² together: 9.9, 9.93 or 10.5 was written down.
    for (const footage of [9.9, 9.93, 10.5])
      expect(piecesFromLot(typed(footage, 10), eleven).pieces).toBe(210);
    const used = typed(9.93, 10);
    const three = areaForPieces(used, piecesFromLot(used, eleven), 63);
    expect(piecesFromLot({ ...used, freeArea: used.freeArea - three }, eleven).pieces).toBe(147);
    expect(usableArea(used)).toBe(used.freeArea);
  });

  it('cuts nothing from panels, strips or offcuts that are too narrow, whatever their area', () => {
    const small = { ...side, panel: { widthMm: 250, heightMm: 300 } };
    const none = piecesFromLot(small, cut);
    expect(none).toMatchObject({ pieces: 0, by: 'panels' });
    expect(areaForPieces(small, none, none.pieces)).toBe(0);
    const strip = { ...side, panel: { widthMm: 3000, heightMm: 100 }, offcuts: 1 };
    expect(piecesFromLot(strip, cut).pieces).toBe(0);
    // Where nobody knows the sides of the pattern's panel, the area is all there is to go by.
    expect(piecesFromLot(strip, { ...cut, sides: null })).toMatchObject({
      pieces: 14 * 12,
      by: 'area',
    });
  });

  it('cuts from an offcut what lies within its sides and within its area', () => {
    const offcut = (widthMm: number, heightMm: number, area = widthMm * heightMm): LotToCut => ({
      ...side,
      freeArea: mm2(area),
      measuredArea: mm2(area),
      panel: { widthMm, heightMm },
      offcuts: 1,
    });
    expect(piecesFromLot(offcut(400, 300), cut)).toMatchObject({ pieces: 12, perUnit: 12 });
    expect(piecesFromLot(offcut(650, 420), cut).pieces).toBe(24);
    // A corner is gone: two would lie within the sides, and only one within the area.
    expect(piecesFromLot(offcut(600, 400, 239_999), cut).pieces).toBe(12);
    expect(piecesFromLot(offcut(400, 300, 119_999), cut).pieces).toBe(0);
    // One of its two panels is gone with its share of the waste; or the only one, and its waste is left.
    const half = { ...offcut(650, 420), freeArea: mm2(650 * 210) };
    expect(piecesFromLot(half, cut).pieces).toBe(12);
    const waste = { ...offcut(550, 550), freeArea: mm2(550 * 550 - 120_000) };
    expect(piecesFromLot(waste, cut).pieces).toBe(0);
    expect(piecesFromLot({ ...offcut(300, 400, 360_000), offcuts: 3 }, cut).pieces).toBe(36);
  });

  it('loses no panel of an offcut and leaves no crumb of it, in however many goes it is used', () => {
    const sides = fc.record({
      widthMm: fc.integer({ min: 300, max: 3000 }),
      heightMm: fc.integer({ min: 400, max: 3000 }),
      odd: fc.nat(2),
    });
    fc.assert(
      fc.property(sides, ({ odd, ...panel }) => {
        const area = mm2(panel.widthMm * panel.heightMm) - odd;
        const whole: LotToCut = { ...side, freeArea: area, measuredArea: area, panel, offcuts: 1 };
        const first = piecesFromLot(whole, cut);
        let left = whole;
        for (let pieces = first.pieces; pieces > 0; pieces -= 12) {
          const from = piecesFromLot(left, cut);
          expect(from.pieces).toBe(pieces);
          left = { ...left, freeArea: left.freeArea - areaForPieces(left, from, 12) };
        }
        expect(piecesFromLot(left, cut).pieces).toBe(0);
        if (first.pieces > 0) expect(left.freeArea).toBe(0);
      }),
    );
  });

  it('keeps to whole numbers where a share would not end', () => {
    const odd = { ...side, measuredArea: 9_007_199_254_740_991, freeArea: 9_007_199_254_740_991 };
    expect(usableArea({ ...odd, usablePercent: 33.3333 })).toBe(3_002_396_749_180_578);
    const laid = piecesFromLot(odd, cut, 3);
    expect(areaForPieces(odd, laid, 1)).toBe(3_002_399_751_580_331);
    expect(areaForPieces(odd, laid, 3)).toBe(odd.freeArea);
  });

  it('gives as many pieces taken in two goes as in one, and never takes more than is free', () => {
    const lots = fc.record({
      share: fc.integer({ min: 0, max: 100 }),
      usable: fc.integer({ min: 1, max: 100 }),
      laid: fc.option(fc.integer({ min: 0, max: 300 })),
    });
    fc.assert(
      fc.property(lots, fc.nat(300), ({ share, usable, laid }, first) => {
        const lot = { ...side, freeArea: mm2(share * 20_000), usablePercent: usable };
        const all = piecesFromLot(lot, cut, laid);
        const taken = Math.min(all.pieces, Math.ceil(first / all.perUnit) * all.perUnit);
        const area = areaForPieces(lot, all, taken);
        expect(area).toBeLessThanOrEqual(lot.freeArea);
        const left = { ...lot, freeArea: lot.freeArea - area };
        const rest = piecesFromLot(left, cut, laid).pieces;
        expect(taken + rest).toBeLessThanOrEqual(all.pieces);
        expect(taken + rest).toBeGreaterThanOrEqual(all.pieces - 1);
      }),
    );
  });
});
