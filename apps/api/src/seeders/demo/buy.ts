import { convert } from '@hidewright/domain';
import { putPurchaseOrderOnPaper } from '../../flows/put-purchase-order-on-paper.ts';
import { receiveDelivery } from '../../flows/receive-delivery.ts';
import { sendPurchaseOrder } from '../../flows/send-purchase-order.ts';
import { Hardware } from '../../modules/hardware/hardware.entity.ts';
import { Leather } from '../../modules/leathers/leather.entity.ts';
import { draftPurchaseOrder } from '../../modules/purchase-orders/draft-purchase-order.ts';
import { PurchaseLine } from '../../modules/purchase-orders/purchase-line.entity.ts';
import { priceText } from '../../http/decimal-text.ts';
import type { Work } from '../../work.ts';
import type { DemoShop } from './demo-shop.ts';
import type { Furnished } from './furnish.ts';
import { onItsWay, purchases, suppliers } from './scenario/stockroom.ts';
import type { Year } from './year.ts';

type Purchase = (typeof purchases)[number];

/** A supplier takes its lead days; the last order is still on its way when the year ends. */
export function planPurchases(shop: DemoShop, year: Year, furnished: Furnished): void {
  for (const purchase of purchases) {
    const leadDays =
      suppliers.find((supplier) => supplier.name === purchase.supplier)?.leadDays ?? 0;
    let orderId = 0;
    year.plan(purchase.daysBefore + leadDays, '08:20', async () => {
      orderId = await order(shop, furnished, purchase, year.day(purchase.daysBefore));
    });
    year.plan(purchase.daysBefore, '11:15', () =>
      shop.as('maker', (work) => receive(work, furnished, purchase, orderId)),
    );
  }
  year.plan(onItsWay.daysBefore, '08:40', async () => {
    await order(shop, furnished, onItsWay, year.end);
  });
}

async function order(
  shop: DemoShop,
  furnished: Furnished,
  purchase: Purchase,
  expectedOn: string,
): Promise<number> {
  const id = await shop.as('owner', async (work) => {
    const supplierId = furnished.suppliers.id(purchase.supplier);
    const lines = [
      ...(await leatherLines(work, furnished, purchase)),
      ...(await hardwareLines(work, furnished, purchase)),
    ];
    return (await draftPurchaseOrder(work, { supplierId, expectedOn, note: '', lines })).id;
  });
  const drawn = await putPurchaseOrderOnPaper(shop.context, shop.person('owner'), id);
  await shop.as('owner', (work) =>
    sendPurchaseOrder(work, { id, by: 'mail', mailIsSet: true }, drawn),
  );
  return id;
}

async function leatherLines({ em }: Work, furnished: Furnished, { leather = [] }: Purchase) {
  const lines = [];
  for (const { name, areasFt2 } of leather) {
    const leatherId = furnished.leathers.id(name);
    const { pricePerFt2 } = await em.findOneOrFail(Leather, leatherId);
    const areaMm2 = areaOf(areasFt2.reduce((sum, ft2) => sum + Number(ft2), 0).toFixed(1));
    lines.push({ of: 'leather' as const, leatherId, areaMm2, unitPrice: priceText(pricePerFt2) });
  }
  return lines;
}

async function hardwareLines({ em }: Work, furnished: Furnished, { hardware = [] }: Purchase) {
  const lines = [];
  for (const { name, quantity } of hardware) {
    const hardwareId = furnished.hardware.id(name);
    const { unitPrice } = await em.findOneOrFail(Hardware, hardwareId);
    lines.push({ of: 'hardware' as const, hardwareId, quantity, unitPrice: priceText(unitPrice) });
  }
  return lines;
}

async function receive(
  work: Work,
  furnished: Furnished,
  purchase: Purchase,
  purchaseOrderId: number,
): Promise<void> {
  const open = await work.em.find(PurchaseLine, { purchaseOrderId });
  const lots = (purchase.leather ?? []).flatMap(({ name, form, areasFt2, shade }) => {
    const leatherId = furnished.leathers.id(name);
    const purchaseLineId = open.find((line) => line.leatherId === leatherId)?.id ?? null;
    return areasFt2.map((ft2) => ({
      ...blankLot,
      leatherId,
      purchaseLineId,
      form,
      measuredAreaMm2: areaOf(ft2),
      shade,
    }));
  });
  const hardware = (purchase.hardware ?? []).map(({ name, quantity }) => {
    const hardwareId = furnished.hardware.id(name);
    const purchaseLineId = open.find((line) => line.hardwareId === hardwareId)?.id ?? null;
    return { hardwareId, purchaseLineId, quantity, batch: '', cost: null };
  });
  await receiveDelivery(work, {
    purchaseOrderId,
    receivedOn: work.today,
    lots,
    hardware,
    receiptsSeen: null,
    freight: '0.00',
    duty: '0.00',
    sharedBy: 'value',
    nothingMore: false,
  });
}

const blankLot = {
  tag: '',
  markedAreaMm2: null,
  pieces: 1,
  widthMm: null,
  heightMm: null,
  cost: null,
  grade: 'A',
  place: 'rack 1',
  supplierLot: '',
};

const areaOf = (ft2: string) => convert(ft2, 'ft2', 'mm2').toString();
