import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { adviseCut, adviseLots, type CutSource } from './advise.ts';

const source = (key: string, pieces: number, price: string, more: object = {}): CutSource => ({
  key,
  pieces,
  areaMm2: '92903.04',
  price,
  available: null,
  ...more,
});

describe('adviseCut', () => {
  it('sets the whole price beside the share that the run uses', () => {
    const [panel] = adviseCut({ cut: 50, good: 40, minorDigits: 2 }, [
      source('panel', 20, '10.00'),
    ]);
    expect(panel).toEqual({
      key: 'panel',
      needed: 3,
      wholePrice: '30.00',
      sharePrice: '25.00',
      perGoodPiece: '0.7500',
      areaPerGoodMm2: '5806.440',
      cheapest: true,
    });
  });

  it('marks the cheapest that there is enough of', () => {
    const rows = adviseCut({ cut: 100, good: 90, minorDigits: 2 }, [
      source('small', 20, '10.00'),
      source('rack', 60, '12.00', { available: 1 }),
      source('large', 45, '21.00'),
      source('nothing', 0, '1.00'),
    ]);
    expect(rows.map(({ key, needed, cheapest }) => [key, needed, cheapest])).toEqual([
      ['small', 5, true],
      ['rack', null, false],
      ['large', 3, false],
      ['nothing', null, false],
    ]);
  });

  it('never asks less for the whole than for the share', () => {
    const whole = fc.integer({ min: 1, max: 500 });
    fc.assert(
      fc.property(whole, whole, fc.integer({ min: 0, max: 9999 }), (cut, pieces, cents) => {
        const price = (cents / 100).toFixed(2);
        const [row] = adviseCut({ cut, good: cut, minorDigits: 2 }, [source('a', pieces, price)]);
        expect(Number(row?.wholePrice)).toBeGreaterThanOrEqual(Number(row?.sharePrice));
        expect((row?.needed ?? 0) * pieces).toBeGreaterThanOrEqual(cut);
      }),
    );
  });

  it.each([
    ['cut', { cut: 0, good: 1 }],
    ['good', { cut: 5, good: 6 }],
  ])('refuses %s that makes no sense', (field, run) => {
    expect(() => adviseCut({ ...run, minorDigits: 2 }, [])).toThrow(
      expect.objectContaining({ field }),
    );
  });
});

describe('adviseLots', () => {
  const lot = (lotId: number, pieces: number) => ({ lotId, tag: `T-${lotId}`, pieces });

  it('takes one lot, the smallest that does', () => {
    expect(adviseLots([lot(1, 300), lot(2, 120), lot(3, 90)], 100)).toEqual([lot(2, 120)]);
  });

  it('takes the fewest where no single one does', () => {
    const lots = [lot(1, 60), lot(2, 50), lot(3, 45), lot(4, 30)];
    expect(adviseLots(lots, 100)).toEqual([lot(1, 60), lot(3, 45)]);
  });

  it('says so where all together do not', () => {
    expect(adviseLots([lot(1, 60), lot(2, 0)], 61)).toBeNull();
  });
});
