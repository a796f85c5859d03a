import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { type CostedMovement, type CostMethod, stockCost } from './stock-cost.ts';

const aMethod = fc.constantFrom<CostMethod>('fifo', 'movingAverage');
const aCost = fc.integer({ min: 0, max: 50_000 }).map((cents) => (cents / 100).toFixed(2));
const aReceipt = fc.tuple(fc.integer({ min: 1, max: 400 }), aCost, fc.nat({ max: 100 }));

/** Receipts, each followed by taking a share of what is there. */
const movements = fc.array(aReceipt, { minLength: 1, maxLength: 12 }).map((receipts) => {
  let there = 0;
  return receipts.flatMap(([quantity, unitCost, percent]): CostedMovement[] => {
    const out = Math.floor(((there + quantity) * percent) / 100);
    there += quantity - out;
    const receipt = { in: String(quantity), unitCost };
    return out > 0 ? [receipt, { out: String(out) }] : [receipt];
  });
});

const onHand = (each: readonly CostedMovement[]): number =>
  each.reduce((sum, one) => sum + ('in' in one ? Number(one.in) : -Number(one.out)), 0);

describe('stockCost', () => {
  it('loses no cent, whatever the method', () => {
    fc.assert(
      fc.property(movements, aMethod, (each, method) => {
        const { costOfGoods, value } = stockCost(each, method);
        const received = each.reduce(
          (sum, one) =>
            sum + ('in' in one ? Number(one.in) * Math.round(Number(one.unitCost) * 100) : 0),
          0,
        );
        expect(Math.round(Number(costOfGoods) * 100) + Math.round(Number(value) * 100)).toBe(
          received,
        );
      }),
    );
  });

  it('leaves nothing where everything is taken', () => {
    fc.assert(
      fc.property(movements, aMethod, (each, method) => {
        const left = onHand(each);
        const all = left > 0 ? [...each, { out: String(left) }] : each;
        expect(stockCost(all, method).value).toBe('0.00');
      }),
    );
  });

  it('is the same by both methods at one price', () => {
    fc.assert(
      fc.property(movements, aCost, (each, unitCost) => {
        const flat = each.map((one) => ('in' in one ? { ...one, unitCost } : one));
        expect(stockCost(flat, 'fifo')).toEqual(stockCost(flat, 'movingAverage'));
      }),
    );
  });

  it('values what is left by itself where receipts come to parts of a cent', () => {
    const pin = [{ in: '9', unitCost: '33.337' }, { out: '8' }];
    expect(stockCost(pin, 'movingAverage')).toEqual({ costOfGoods: '266.70', value: '33.34' });
    const dye = [{ in: '44.69', unitCost: '13.97' }, { out: '43.85' }];
    expect(stockCost(dye, 'fifo').value).toBe('11.73');
    // Half a cent on both sides: 427.275 and 226.825 of 654.10.
    const halves = [{ in: '31', unitCost: '21.10' }, { out: '20.25' }];
    expect(stockCost(halves, 'fifo')).toEqual({ costOfGoods: '427.28', value: '226.82' });
  });

  it('takes parts of a hide', () => {
    const each = [{ in: '24.75', unitCost: '8.0000' }, { out: '4.5' }];
    expect(stockCost(each, 'fifo')).toEqual({ costOfGoods: '36.00', value: '162.00' });
  });

  it.each([
    ['movements.1.out', [{ in: '5', unitCost: '1' }, { out: '6' }]],
    ['movements.0.out', [{ out: '1' }]],
    ['movements.0.in', [{ in: '0', unitCost: '1' }]],
    ['movements.0.in', [{ in: '-2', unitCost: '1' }]],
    ['movements.0.unitCost', [{ in: '2', unitCost: '-1' }]],
  ])('refuses %s where it makes no sense', (field, each) => {
    expect(() => stockCost(each as CostedMovement[], 'fifo')).toThrow(
      expect.objectContaining({ field }),
    );
  });
});
