import { receiveDelivery, type PurchaseLine, type PurchaseOrder } from '@hidewright/contract';
import { describe, expect, it } from 'vitest';
import { blankLot, deliveryOf, isOpen } from './typed-delivery.ts';

const none = {
  areaMm2: null,
  receivedAreaMm2: null,
  quantity: null,
  received: null,
  leatherId: null,
  hardwareId: null,
};
const lines: PurchaseLine[] = [
  {
    ...none,
    id: 1,
    position: 1,
    of: 'leather',
    name: 'Oak tan',
    leatherId: 5,
    areaMm2: '3716121.6',
    receivedAreaMm2: '0',
  },
  {
    ...none,
    id: 2,
    position: 2,
    of: 'hardware',
    name: 'Rivet',
    hardwareId: 6,
    quantity: 1000,
    received: 400,
  },
  {
    ...none,
    id: 3,
    position: 3,
    of: 'hardware',
    name: 'Snap',
    hardwareId: 7,
    quantity: 10,
    received: 10,
  },
  {
    ...none,
    id: 4,
    position: 4,
    of: 'leather',
    name: 'Belly',
    leatherId: 8,
    areaMm2: '10',
    receivedAreaMm2: '12',
  },
];

describe('a delivery', () => {
  it('begins with what an order still awaits', () => {
    expect(lines.map(isOpen)).toEqual([true, true, false, false]);
    const delivery = deliveryOf({ id: 9, lines } as PurchaseOrder, '2026-12-01');
    expect(delivery).toMatchObject({
      purchaseOrderId: 9,
      receivedOn: '2026-12-01',
      lots: [{ leatherId: 5, purchaseLineId: 1, measuredAreaMm2: '' }],
      hardware: [{ hardwareId: 6, purchaseLineId: 2, quantity: 600 }],
    });
  });

  it('is what the contract takes, once a lot is measured', () => {
    const lot = { ...blankLot(5, null), measuredAreaMm2: '2299350.24' };
    expect(receiveDelivery.body?.safeParse({ lots: [lot] }).success).toBe(true);
    expect(receiveDelivery.body?.safeParse({ lots: [blankLot(5, null)] }).success).toBe(false);
    expect(
      receiveDelivery.body?.safeParse({ lots: [{ ...lot, ...{ leatherId: '' } }] }).success,
    ).toBe(false);
  });
});
