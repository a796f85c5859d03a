import { receiveDelivery, type PurchaseLine, type PurchaseOrder } from '@hidewright/contract';
import { describe, expect, it } from 'vitest';
import { blankLot, deliveryOf, isOpen, nextLot, withoutWhatCame } from './typed-delivery.ts';

const nothing = { areaMm2: null, quantity: null };
const none = {
  unit: null,
  service: null,
  areaMm2: null,
  articleNumber: '',
  receivedAreaMm2: null,
  measuredAreaMm2: null,
  whole: null,
  quantity: null,
  received: null,
  leatherId: null,
  hardwareId: null,
  toCome: nothing,
  over: nothing,
  short: nothing,
  sentBack: null,
  expectedOn: null,
};
const leather = (id: number, name: string, areaMm2: string, toCome: string): PurchaseLine => ({
  ...none,
  id,
  position: id,
  of: 'leather',
  name,
  leatherId: 4 + id,
  areaMm2,
  toCome: { areaMm2: toCome, quantity: null },
});
const hardware = (id: number, name: string, quantity: number, toCome: number): PurchaseLine => ({
  ...none,
  id,
  position: id,
  of: 'hardware',
  name,
  hardwareId: 4 + id,
  quantity,
  received: quantity - toCome,
  toCome: { areaMm2: null, quantity: toCome },
});
const lines = [
  leather(1, 'Oak tan', '3716121.6', '3716121.6'),
  hardware(2, 'Rivet', 1000, 600),
  hardware(3, 'Snap', 10, 0),
  leather(4, 'Belly', '10', '0'),
];

describe('a delivery', () => {
  it('begins with what an order still awaits', () => {
    expect(lines.map(isOpen)).toEqual([true, true, false, false]);
    const delivery = deliveryOf({ id: 9, lines, receipts: 1 } as PurchaseOrder, '2026-12-01');
    expect(delivery).toMatchObject({
      purchaseOrderId: 9,
      receiptsSeen: 1,
      receivedOn: '2026-12-01',
      lots: [{ leatherId: 5, purchaseLineId: 1, measuredAreaMm2: '' }],
      hardware: [{ hardwareId: 6, purchaseLineId: 2, quantity: 600 }],
    });
  });

  it('begins with the leather that went out, as what it has become', () => {
    const service = { lotForm: 'bend', becomesLeatherId: 8, lotTag: 'T-0007' };
    const out = { ...leather(1, 'Dyeing of T-0007', '40', '40'), leatherId: null, service };
    const order = { id: 9, lines: [out], receipts: 0 } as unknown as PurchaseOrder;
    expect(deliveryOf(order, '2026-12-01').lots).toMatchObject([
      { leatherId: 8, purchaseLineId: 1, form: 'bend', measuredAreaMm2: '40' },
    ]);
  });

  it('keeps what was typed and loses what somebody else has received', () => {
    const first = deliveryOf({ id: 9, lines, receipts: 0 } as PurchaseOrder, '2026-12-01');
    const typed = { ...first, lots: first.lots?.map((lot) => ({ ...lot, place: 'rack 2' })) ?? [] };
    const now = [leather(1, 'Oak tan', '3716121.6', '1000000'), hardware(2, 'Rivet', 1000, 150)];
    const part = withoutWhatCame(typed, { lines: now, receipts: 2 } as PurchaseOrder);
    expect(part).toMatchObject({
      receiptsSeen: 2,
      lots: [{ purchaseLineId: 1, place: 'rack 2' }],
      hardware: [{ purchaseLineId: 2, quantity: 150 }],
    });
    const all = [leather(1, 'Oak tan', '3716121.6', '0'), hardware(2, 'Rivet', 1000, 0)];
    const none = withoutWhatCame(typed, { lines: all, receipts: 3 } as PurchaseOrder);
    expect([none.lots, none.hardware]).toEqual([[], []]);
  });

  it('begins the next lot where the last one hangs, with nothing measured', () => {
    const before = { ...blankLot(5, 1), measuredAreaMm2: '7', shade: 'dark', place: 'rack 2' };
    expect(nextLot(before, blankLot(5, 1))).toMatchObject({
      measuredAreaMm2: '',
      markedAreaMm2: null,
      tag: '',
      shade: 'dark',
      place: 'rack 2',
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
