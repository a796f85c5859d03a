import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { Exact } from '../numbers/decimal-text.ts';
import type { OfferTerms } from './supplier-offer.ts';
import { amountToBuy, leatherToBuy, packsOf } from './what-to-buy.ts';

const sold = (rest: Partial<OfferTerms> = {}): OfferTerms => ({
  minimum: null,
  multiple: null,
  breaks: [{ from: '0', price: '0.20' }],
  ...rest,
});

const russet = (terms: OfferTerms, areaMm2: string | null = null) => ({
  whole: areaMm2 === null ? null : { form: 'side', areaMm2 },
  usablePercent: '85',
  buying: { supplierId: null, supplier: null, arrivesOn: null, drafted: 0, drafts: [], terms },
});

describe('what to buy of a thing', () => {
  it('comes in full packs, and never below the minimum', () => {
    expect(amountToBuy(sold({ multiple: '100' }), '110').quantity).toBe('200');
    expect(amountToBuy(sold(), '110').quantity).toBe('110');
    expect(amountToBuy(sold({ multiple: '100', minimum: '500' }), '110').quantity).toBe('500');
  });

  it('goes on to a price break that costs less, and names one that costs the same', () => {
    const breaks = [...sold().breaks, { from: '200', price: '0.15' }];
    expect(amountToBuy(sold({ breaks }), '161')).toEqual({
      ...{ quantity: '200', plain: '161', sameCost: null },
    });
    expect(amountToBuy(sold({ breaks }), '150')).toEqual({
      ...{ quantity: '150', plain: '150', sameCost: '200' },
    });
    expect(amountToBuy(sold({ breaks }), '149').sameCost).toBeNull();
  });

  it('buys no more where nobody said what it costs', () => {
    const breaks = ['0', '200'].map((from) => ({ from, price: '0' }));
    expect(amountToBuy(sold({ breaks }), '10')).toEqual({
      ...{ quantity: '10', plain: '10', sameCost: null },
    });
  });

  it('is enough, is sold, and costs no more than the least that would do', () => {
    const input = fc.record({
      needed: fc.integer({ min: 1, max: 5_000 }),
      multiple: fc.integer({ min: 1, max: 100 }),
      from: fc.integer({ min: 1, max: 9_000 }),
      later: fc.integer({ min: 0, max: 100 }),
    });
    fc.assert(
      fc.property(input, ({ needed, multiple, from, later }) => {
        const breaks = [
          { from: '0', price: '1' },
          { from: String(from), price: new Exact(later).div(100).toFixed() },
        ];
        const { quantity, plain } = amountToBuy(
          sold({ multiple: String(multiple), breaks }),
          String(needed),
        );
        const cost = (count: string) => Number(count) * (Number(count) >= from ? later / 100 : 1);
        expect(Number(plain)).toBe(Math.ceil(needed / multiple) * multiple);
        expect(Number(quantity) % multiple).toBe(0);
        expect(Number(quantity)).toBeGreaterThanOrEqual(needed);
        expect(cost(quantity)).toBeLessThanOrEqual(cost(plain) + 1e-6);
      }),
    );
  });

  it('says full packs only where it is sold in packs', () => {
    expect(packsOf(sold({ multiple: '50' }), '200')).toBe(4);
    expect(packsOf(sold({ multiple: '1' }), '200')).toBeNull();
    expect(packsOf(sold(), '200')).toBeNull();
  });
});

describe('what to buy of a leather', () => {
  const usable = 1_700_000_000;

  it('is enough to cut the area from, in whole sides where it comes in sides', () => {
    expect(leatherToBuy(russet(sold({ multiple: '1' })), usable)).toMatchObject({
      ...{ quantity: '2000000', whole: null },
    });
    const bySide = russet(sold({ multiple: '2000000' }), '2000000');
    expect(leatherToBuy(bySide, usable)).toMatchObject({
      ...{ quantity: '2000000', whole: { count: 1, form: 'side' } },
    });
    expect(leatherToBuy(bySide, usable + 1)).toMatchObject({
      ...{ quantity: '4000000', whole: { count: 2, form: 'side' } },
    });
  });

  it('names no sides where the supplier sells it otherwise', () => {
    const bundles = russet(sold({ multiple: '3000000' }), '2000000');
    expect(leatherToBuy(bundles, usable)).toMatchObject({ quantity: '3000000', whole: null });
  });
});
