import type { PurchaseOrder } from '@hidewright/contract';
import { describe, expect, it } from 'vitest';
import { amountOf, blankLine, blankService, typedOf } from './typed-order.ts';

describe('an order as it is typed', () => {
  it('adds up what is filled in, each line to the cent', () => {
    const lines = [
      { of: 'leather', leatherId: 1, areaMm2: '2299350.24', unitPrice: '8.50' },
      { of: 'hardware', hardwareId: 2, quantity: 1000, unitPrice: '0.1625' },
    ] as const;
    expect(amountOf(lines)).toBe('372.88');
  });

  it('leaves out what is still open', () => {
    expect(amountOf([blankLine('leather'), { of: 'hardware', quantity: 10, unitPrice: '' }])).toBe(
      '0.00',
    );
  });

  it.each<[string, object]>([
    ['a quantity below 1', { quantity: -5 }],
    ['a quantity that is no number', { quantity: 'abc' }],
    ['parts of a piece', { quantity: '2.5' }],
    ['a price that is no number', { unitPrice: 'ten' }],
    ['a price below 0', { unitPrice: '-1' }],
  ])('comes to nothing with %s on a line', (_what, wrong) => {
    const line = { of: 'hardware', hardwareId: 2, quantity: 10, unitPrice: '0.17' } as const;
    const leather = {
      of: 'leather',
      leatherId: 1,
      areaMm2: '929030.4',
      unitPrice: '8.50',
    } as const;
    expect(amountOf([leather, line])).toBe('86.70');
    expect(amountOf([leather, { ...line, ...wrong } as typeof line])).toBeUndefined();
  });

  it('begins with a pack of what was chosen, and its price still open', () => {
    expect(blankLine('hardware', { id: 7, name: 'Rivet', price: '0.17', packSize: 500 })).toEqual({
      of: 'hardware',
      hardwareId: 7,
      quantity: 500,
      unitPrice: '',
    });
  });
});

describe('work on a lot', () => {
  const lot = {
    ...{ id: 7, tag: 'T-0007', leatherId: 1, leatherName: 'Oak tan' },
    freeAreaMm2: '2229672.96',
  } as const;

  it('costs its price per ft² of all that is free, of what is typed, or for the lot', () => {
    const work = { ...blankService(lot.id), unitPrice: '1.50' };
    expect(amountOf([work], [lot])).toBe('36.00');
    expect(amountOf([{ ...work, areaMm2: '929030.4' }], [lot])).toBe('15.00');
    expect(amountOf([{ ...work, unitPrice: null, fixedPrice: '22.5' }], [lot])).toBe('22.50');
    expect(amountOf([work])).toBe('0.00');
  });

  it('is typed again as its draft has it', () => {
    const line = {
      ...{ of: 'service', leatherId: null, hardwareId: null, areaMm2: '929030.4' },
      ...{ unitPrice: '0.00', fixedPrice: '22.50' },
      service: { word: 'splitting', lotId: 7, becomesLeatherId: 3 },
    };
    const order = { supplierId: 2, expectedOn: null, note: '', lines: [line] };
    expect(typedOf(order as unknown as PurchaseOrder).lines).toEqual([
      {
        ...{ of: 'service', service: 'splitting', lotId: 7, areaMm2: '929030.4' },
        ...{ becomesLeatherId: 3, unitPrice: null, fixedPrice: '22.50' },
      },
    ]);
  });
});
