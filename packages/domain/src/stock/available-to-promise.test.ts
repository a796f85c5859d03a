import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { availableToPromise } from './available-to-promise.ts';

const aCount = fc.integer({ min: 0, max: 90 });
const periods = fc
  .array(fc.tuple(fc.oneof(fc.constant(0), aCount), aCount), { minLength: 1, maxLength: 10 })
  .map((each) => ({
    receipts: each.map(([receipt]) => receipt),
    orders: each.map(([, order]) => order),
  }));

const sum = (values: readonly (number | null)[]): number =>
  values.reduce<number>((total, value) => total + (value ?? 0), 0);

describe('availableToPromise', () => {
  it('gives away what comes in and is not ordered, neither more nor less', () => {
    fc.assert(
      fc.property(aCount, periods, (onHand, { receipts, orders }) => {
        const available = availableToPromise({ onHand, receipts, orders });
        expect(sum(available)).toBe(onHand + sum(receipts) - sum(orders));
      }),
    );
  });

  it('never promises what an earlier or a later order needs', () => {
    fc.assert(
      fc.property(aCount, periods, (onHand, { receipts, orders }) => {
        const available = availableToPromise({ onHand, receipts, orders });
        if ((available[0] ?? 0) < 0) return;
        let there = onHand;
        receipts.forEach((receipt, at) => {
          there += receipt - (orders[at] ?? 0) - (available[at] ?? 0);
          expect(there).toBeGreaterThanOrEqual(0);
        });
      }),
    );
  });

  it('is null exactly where nothing is received, but for the first period', () => {
    fc.assert(
      fc.property(aCount, periods, (onHand, { receipts, orders }) => {
        availableToPromise({ onHand, receipts, orders }).forEach((free, at) => {
          expect(free === null).toBe(at > 0 && receipts[at] === 0);
        });
      }),
    );
  });

  it('makes good a lack from the receipt before it', () => {
    const asked = { onHand: 10, receipts: [0, 20, 20], orders: [5, 5, 30] };
    expect(availableToPromise(asked)).toEqual([5, 5, 0]);
    expect(availableToPromise({ ...asked, orders: [5, 5, 50] })).toEqual([-10, 0, 0]);
  });

  it.each([
    ['onHand', { onHand: -1 }],
    ['receipts', { receipts: [], orders: [] }],
    ['orders', { orders: [1] }],
    ['orders.1', { orders: [1, -1] }],
    ['receipts.0', { receipts: [Number.NaN, 1] }],
  ])('refuses %s where it makes no sense', (field, change) => {
    const asked = { onHand: 1, receipts: [1, 1], orders: [1, 1] };
    expect(() => availableToPromise({ ...asked, ...change })).toThrow(
      expect.objectContaining({ field }),
    );
  });
});
