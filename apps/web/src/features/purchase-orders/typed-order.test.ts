import { describe, expect, it } from 'vitest';
import { amountOf, blankLine } from './typed-order.ts';

describe('an order as it is typed', () => {
  it('adds up what is filled in, each line to the cent', () => {
    const lines = [
      { of: 'leather', leatherId: 1, areaMm2: '2299350.24', unitPrice: '8.50' },
      { of: 'hardware', hardwareId: 2, quantity: 1000, unitPrice: '0.1625' },
    ] as const;
    expect(amountOf(lines)).toBe('372.88');
  });

  it('leaves out what makes no sense yet', () => {
    expect(
      amountOf([blankLine('leather'), { of: 'hardware', quantity: 10, unitPrice: 'ten' }]),
    ).toBe('0.00');
  });

  it('begins with a pack and the last price of what was chosen', () => {
    expect(blankLine('hardware', { id: 7, name: 'Rivet', price: '0.17', packSize: 500 })).toEqual({
      of: 'hardware',
      hardwareId: 7,
      quantity: 500,
      unitPrice: '0.17',
    });
  });
});
