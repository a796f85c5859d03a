import type { PurchaseLine, SupplierOfferReply } from '@hidewright/contract';
import { expect, it } from 'vitest';
import { orderRemarks } from './order-remarks.ts';

const offer = (hardwareId: number) =>
  ({
    ...{ of: 'hardware', leatherId: null, hardwareId, unit: 'piece' },
    ...{ minimum: null, multiple: '50' },
    breaks: [
      { from: '1', price: '0.17' },
      { from: '500', price: '0.14' },
    ],
  }) as SupplierOfferReply;

const line = (id: number, hardwareId: number, quantity: number) =>
  ({
    ...{ id, of: 'hardware', leatherId: null, hardwareId, name: `Rivets ${hardwareId}` },
    ...{ areaMm2: null, quantity, unitPrice: '0.17' },
  }) as PurchaseLine;

const dyeing = {
  ...{ id: 9, of: 'service', leatherId: null, hardwareId: null, name: 'Dyeing of T-0001' },
  ...{ areaMm2: '2303995.392', quantity: null, unitPrice: '1.65' },
} as PurchaseLine;

it('names the lines that are not sold like that, and those of which more costs less', () => {
  const lines = [line(1, 7, 320), line(2, 8, 450), line(3, 7, 200), line(4, 6, 320), dyeing];
  expect(orderRemarks({ lines }, [offer(7), offer(8)], { areaUnit: 'ft2' })).toEqual([
    { lineId: 1, name: 'Rivets 7', text: 'Sold in packs of 50: order 300 or 350.' },
    {
      ...{ lineId: 2, name: 'Rivets 8' },
      text: 'From 500 they cost 0.14 each: 500 cost 6.50 less than 450.',
    },
  ]);
});

it('names the lines without a price, whether or not an offer was entered', () => {
  const unpriced = [line(1, 7, 300), line(2, 6, 20)].map((each) => ({
    ...each,
    unitPrice: '0.00',
  }));
  const text = 'Its price is not known: the order asks the supplier for it.';
  expect(orderRemarks({ lines: unpriced }, [offer(7)], { areaUnit: 'ft2' })).toEqual([
    { lineId: 1, name: 'Rivets 7', text },
    { lineId: 2, name: 'Rivets 6', text },
  ]);
});
