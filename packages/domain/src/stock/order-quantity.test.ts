import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { PriceBreak } from '../pricing/price-breaks.ts';
import { orderQuantity } from './order-quantity.ts';
import { productionLot } from './production-lot.ts';

const aDemand = fc.integer({ min: 1, max: 20_000 });
const aCost = fc.integer({ min: 1, max: 20_000 }).map((cents) => (cents / 100).toFixed(2));
const aRate = fc.integer({ min: 1, max: 60 }).map((percent) => percent / 100);
const aLadder: fc.Arbitrary<PriceBreak[]> = fc
  .uniqueArray(fc.record({ from: fc.integer({ min: 2, max: 2000 }), price: aCost }), {
    maxLength: 4,
    selector: ({ from }) => from,
  })
  .map((breaks) => [{ from: 1, price: '100.00' }, ...breaks].sort((a, b) => a.from - b.from));

describe('orderQuantity', () => {
  it('balances ordering and holding', () => {
    fc.assert(
      fc.property(aDemand, aCost, aCost, (demand, orderCost, holdingCost) => {
        const { quantity, annualCost } = orderQuantity({ demand, orderCost, holdingCost });
        const ordering = (demand / quantity) * Number(orderCost);
        expect((quantity / 2) * Number(holdingCost)).toBeCloseTo(ordering, 6);
        expect(Math.abs(Number(annualCost) - 2 * ordering)).toBeLessThan(0.0051);
      }),
    );
  });

  it('costs no more than any whole quantity at its own price', () => {
    fc.assert(
      fc.property(
        aDemand,
        aCost,
        aRate,
        aLadder,
        fc.integer({ min: 1, max: 4000 }),
        (demand, orderCost, holdingRate, breaks, quantity) => {
          const answer = orderQuantity({ demand, orderCost, holdingRate, breaks });
          const price = Number(breaks.findLast(({ from }) => from <= quantity)?.price);
          const ordering = (demand / quantity) * Number(orderCost);
          const year = ordering + (quantity / 2) * holdingRate * price + demand * price;
          expect(Number(answer.annualCost)).toBeLessThanOrEqual(year + 0.0051);
        },
      ),
    );
  });

  it('stays just below a break that would cost more', () => {
    const breaks = [
      { from: 1, price: '5.00' },
      { from: 100, price: '9.00' },
    ];
    const asked = { demand: 5000, orderCost: '49.00', holdingRate: 0.2, breaks };
    expect(orderQuantity(asked).quantity).toBe(99);
  });

  it('orders no less than the first break', () => {
    const asked = { demand: 1, orderCost: '0.01', holdingCost: '50.00' };
    const breaks = [{ from: 25, price: '1.00' }];
    expect(orderQuantity({ ...asked, breaks }).quantity).toBe(25);
  });

  it.each([
    ['demand', { demand: 0 }],
    ['orderCost', { orderCost: '0.00' }],
    ['orderCost', { orderCost: '-3' }],
    ['holdingRate', { holdingRate: 0 }],
    ['breaks', { breaks: [] }],
    ['breaks.0.price', { breaks: [{ from: 1, price: '0' }] }],
  ])('refuses %s where it makes no sense', (field, change) => {
    const breaks = [{ from: 1, price: '2.00' }];
    const asked = { demand: 10, orderCost: '1.00', holdingRate: 0.2, breaks };
    expect(() => orderQuantity({ ...asked, ...change })).toThrow(
      expect.objectContaining({ field }),
    );
  });
});

describe('productionLot', () => {
  it('is larger than an order that comes at once, the more so the slower it is made', () => {
    const lot = { demand: 1000, setupCost: 10, holdingCost: 0.5, used: 4 };
    const atOnce = orderQuantity({ demand: 1000, orderCost: '10', holdingCost: '0.5' }).quantity;
    const [quick, slow] = [productionLot({ ...lot, made: 40 }), productionLot({ ...lot, made: 5 })];
    expect([atOnce < quick, quick < slow]).toEqual([true, true]);
    expect(() => productionLot({ ...lot, made: 4 })).toThrow('More must be made');
  });
});
