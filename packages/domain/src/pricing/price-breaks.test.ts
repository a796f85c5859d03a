import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { type PriceBreak, priceInversions, priceRises } from './price-breaks.ts';

const aLadder: fc.Arbitrary<PriceBreak[]> = fc
  .uniqueArray(
    fc.record({
      from: fc.integer({ min: 1, max: 300 }),
      price: fc.integer({ min: 1, max: 2000 }).map((cents) => (cents / 100).toFixed(2)),
    }),
    { minLength: 1, maxLength: 5, selector: ({ from }) => from },
  )
  .map((breaks) => breaks.sort((a, b) => a.from - b.from));

const centsOf = (price: string): number => Math.round(Number(price) * 100);

describe('priceInversions', () => {
  it('holds exactly the quantities that cost more than a later break', () => {
    fc.assert(
      fc.property(aLadder, (breaks) => {
        const inversions = priceInversions(breaks);
        const totals = breaks.map(({ from, price }) => from * centsOf(price));
        for (let quantity = breaks[0]?.from ?? 1; quantity <= 310; quantity += 1) {
          const at = breaks.findLastIndex(({ from }) => from <= quantity);
          const total = quantity * centsOf(breaks[at]?.price ?? '');
          const saves = total - Math.min(...totals.slice(at + 1), Infinity);
          const named = inversions.find(({ from, until }) => from <= quantity && quantity <= until);
          expect(named !== undefined).toBe(saves > 0);
          if (named?.until === quantity) expect(centsOf(named.saves)).toBe(saves);
        }
      }),
    );
  });

  it('looks beyond the next break', () => {
    const breaks = [
      { from: 10, price: '10.00' },
      { from: 50, price: '9.00' },
      { from: 100, price: '4.00' },
    ];
    expect(priceInversions(breaks)).toEqual([
      { from: 41, until: 49, saves: '90.00' },
      { from: 50, until: 99, saves: '491.00' },
    ]);
  });

  it.each([
    ['breaks', []],
    [
      'breaks.1.from',
      [
        { from: 5, price: '1' },
        { from: 5, price: '1' },
      ],
    ],
    ['breaks.0.from', [{ from: 0, price: '1' }]],
    ['breaks.0.price', [{ from: 1, price: '0.00' }]],
    ['breaks.0.price', [{ from: 1, price: 'cheap' }]],
  ])('refuses %s where it makes no sense', (field, breaks) => {
    expect(() => priceInversions(breaks)).toThrow(expect.objectContaining({ field }));
  });
});

describe('priceRises', () => {
  it('names nothing on a ladder that falls or stays', () => {
    fc.assert(
      fc.property(aLadder, (breaks) => {
        const prices = breaks.map(({ price }) => price).sort((a, b) => Number(b) - Number(a));
        const falling = breaks.map(({ from }, at) => ({ from, price: prices[at] ?? '1' }));
        expect(priceRises(falling)).toEqual([]);
      }),
    );
  });
});
