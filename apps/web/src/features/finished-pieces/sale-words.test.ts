import { describe, expect, it } from 'vitest';
import { saleWorth } from './sale-words.ts';

const shelf = { onHand: 7, value: '10.01' };
const worth = (quantity: unknown, unitPrice: unknown, piece: object = {}) =>
  saleWorth({ quantity, unitPrice }, { ...shelf, ...piece }, 'USD');

describe('what a sale from the shelf brings', () => {
  it('is quantity by price, beside what those pieces cost', () => {
    expect(worth(4, '3.15')).toEqual({ amount: '12.60', cost: '5.72', belowCost: false });
    expect(worth(4, '1.43')?.belowCost).toBe(false);
    expect(worth(4, '1.42')?.belowCost).toBe(true);
    expect(saleWorth({ quantity: 3, unitPrice: '12.5' }, shelf, 'JPY')?.amount).toBe('38');
  });

  it('says no cost of more than lie there, nor to whom it is not told', () => {
    expect(worth(8, '3.15')).toMatchObject({ amount: '25.20', cost: undefined });
    expect(worth(1, '3.15', { value: undefined })).toMatchObject({ cost: undefined });
  });

  it('is nothing while something is missing or no number', () => {
    for (const [quantity, unitPrice] of [
      ['', '3'],
      [0, '3'],
      [4, ''],
      [4, '-1'],
      [4, '1.23456'],
    ])
      expect(worth(quantity, unitPrice)).toBeUndefined();
  });
});
