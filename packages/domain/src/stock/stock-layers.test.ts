import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { stockCost } from './stock-cost.ts';
import { costOfOldest, stockLayers, type ValuedMovement } from './stock-layers.ts';

const receipt = fc.record({
  quantity: fc.integer({ min: 1, max: 400 }),
  value: fc.integer({ min: 0, max: 500_000 }),
});

/** Receipts, each followed by taking a share of what is there, at what the layers say it costs. */
function ledgerOf(each: readonly [ValuedMovement, number][]): ValuedMovement[] {
  const ledger: ValuedMovement[] = [];
  for (const [received, percent] of each) {
    ledger.push(received);
    const there = ledger.reduce((sum, { quantity }) => sum + quantity, 0);
    const quantity = Math.floor((there * percent) / 100);
    const cost = costOfOldest(stockLayers(ledger), quantity);
    if (quantity > 0) ledger.push({ quantity: -quantity, value: -cost });
  }
  return ledger;
}

const ledgers = fc
  .array(fc.tuple(receipt, fc.nat({ max: 100 })), { minLength: 1, maxLength: 15 })
  .map(ledgerOf);

const sum = (all: readonly ValuedMovement[], of: 'quantity' | 'value') =>
  all.reduce((total, each) => total + each[of], 0);

describe('layers of stock', () => {
  it('sum to what the ledger says is there, and is worth', () => {
    fc.assert(
      fc.property(ledgers, (ledger) => {
        const layers = stockLayers(ledger);
        expect(sum(layers, 'quantity')).toBe(sum(ledger, 'quantity'));
        expect(sum(layers, 'value')).toBe(sum(ledger, 'value'));
        for (const layer of layers) expect(layer.quantity).toBeGreaterThan(0);
      }),
    );
  });

  it('cost all that they are worth when all is taken', () => {
    fc.assert(
      fc.property(ledgers, (ledger) => {
        const layers = stockLayers(ledger);
        expect(costOfOldest(layers, sum(layers, 'quantity'))).toBe(sum(layers, 'value'));
      }),
    );
  });

  it('agree with the average where every price is the same', () => {
    const counts = fc.array(fc.tuple(fc.integer({ min: 1, max: 400 }), fc.nat({ max: 100 })), {
      minLength: 1,
      maxLength: 12,
    });
    fc.assert(
      fc.property(counts, fc.integer({ min: 0, max: 2000 }), (each, price) => {
        const ledger = ledgerOf(
          each.map(([quantity, percent]) => [{ quantity, value: quantity * price }, percent]),
        );
        const taken = -ledger.reduce((total, { value }) => total + Math.min(0, value), 0);
        const movements = ledger.map(({ quantity }) =>
          quantity > 0
            ? { in: String(quantity), unitCost: (price / 100).toFixed(2) }
            : { out: String(-quantity) },
        );
        const average = stockCost(movements, 'movingAverage');
        expect((taken / 100).toFixed(2)).toBe(average.costOfGoods);
      }),
    );
  });

  it('are as they were once the last receipt is undone, whatever was there before', () => {
    fc.assert(
      fc.property(ledgers, fc.array(receipt, { minLength: 1, maxLength: 3 }), (ledger, came) => {
        const undone = came.toReversed().map(({ quantity, value }) => ({
          quantity: -quantity,
          value: -value,
          undoes: true,
        }));
        expect(stockLayers([...ledger, ...came, ...undone])).toEqual(stockLayers(ledger));
      }),
    );
  });

  it('keep the rest of a layer that a receipt was a part of', () => {
    const merged = { quantity: 250, value: 900 };
    const undone = { quantity: -100, value: -500, undoes: true };
    expect(stockLayers([merged, undone])).toEqual([{ quantity: 150, value: 400 }]);
  });

  it('are taken from the oldest on', () => {
    const layers = stockLayers([
      { quantity: 150, value: 315_000 },
      { quantity: -120, value: -252_000 },
      { quantity: 225, value: 607_500 },
    ]);
    expect(layers).toEqual([
      { quantity: 30, value: 63_000 },
      { quantity: 225, value: 607_500 },
    ]);
    expect(costOfOldest(layers, 180)).toBe(63_000 + 150 * 2700);
  });
});
