import { addDays, convert } from '@hidewright/domain';
import { draftClaim } from '../../flows/draft-claim.ts';
import { openClaim } from '../../flows/open-claim.ts';
import { putPurchaseOrderOnPaper } from '../../flows/put-purchase-order-on-paper.ts';
import { receiveDelivery } from '../../flows/receive-delivery.ts';
import { sendPurchaseOrder } from '../../flows/send-purchase-order.ts';
import { Hardware } from '../../modules/hardware/hardware.entity.ts';
import { Leather } from '../../modules/leathers/leather.entity.ts';
import { awaitLineOn } from '../../modules/purchase-orders/await-line-on.ts';
import {
  draftPurchaseOrder,
  findPurchaseOrder,
} from '../../modules/purchase-orders/draft-purchase-order.ts';
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
    year.plan(purchase.daysBefore, '11:15', async () => {
      // The maker takes deliveries in; the owner does where the carrier's paper came along.
      const by = purchase.freight === undefined ? 'maker' : 'owner';
      const { receiptId } = await shop.as(by, (work) =>
        receive(work, furnished, purchase, orderId),
      );
      await afterwards(shop, year, purchase, { orderId, receiptId });
    });
  }
  year.plan(onItsWay.daysBefore, '08:40', async () => {
    await order(shop, furnished, onItsWay, year.end);
  });
}

/** What is short is claimed, and the supplier names a day for the rest. */
async function afterwards(
  shop: DemoShop,
  year: Year,
  purchase: Purchase,
  { orderId, receiptId }: { orderId: number; receiptId: number | null },
): Promise<void> {
  const { leather = [], restInDays } = purchase;
  if (receiptId !== null && leather.some(({ markedFt2 }) => markedFt2 !== undefined)) {
    await shop.as('owner', async (work) => {
      const { text } = await draftClaim(work, receiptId);
      await openClaim(work, { receiptId, by: 'mail', text, mailIsSet: true });
    });
  }
  if (restInDays === undefined) return;
  await shop.as('owner', async (work) => {
    const order = await findPurchaseOrder(work, orderId);
    const lines = await work.em.find(PurchaseLine, { purchaseOrderId: orderId });
    const expectedOn = addDays(year.end, restInDays);
    for (const { id: lineId } of lines.filter((line) => line.received < line.quantity))
      await awaitLineOn(work, order, { lineId, expectedOn });
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
  for (const { name, areasFt2, markedFt2 = areasFt2 } of leather) {
    const leatherId = furnished.leathers.id(name);
    const { pricePerFt2 } = await em.findOneOrFail(Leather, leatherId);
    const areaMm2 = areaOf(markedFt2.reduce((sum, ft2) => sum + Number(ft2), 0).toFixed(2));
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
) {
  const open = await work.em.find(PurchaseLine, { purchaseOrderId });
  const lots = (purchase.leather ?? []).flatMap((hides) => {
    const { name, form, areasFt2, markedFt2, weightsOz, shade } = hides;
    const leatherId = furnished.leathers.id(name);
    const purchaseLineId = open.find((line) => line.leatherId === leatherId)?.id ?? null;
    return areasFt2.map((ft2, at) => ({
      ...blankLot,
      leatherId,
      purchaseLineId,
      form,
      measuredAreaMm2: areaOf(ft2),
      weightOz: weightsOz?.[at] ?? null,
      markedAreaMm2: markedFt2?.[at] === undefined ? null : areaOf(markedFt2[at]),
      shade,
    }));
  });
  const hardware = (purchase.hardware ?? []).map(
    ({ name, quantity, came = quantity, batch = '' }) => {
      const hardwareId = furnished.hardware.id(name);
      const purchaseLineId = open.find((line) => line.hardwareId === hardwareId)?.id ?? null;
      return { hardwareId, purchaseLineId, quantity: came, batch, cost: null };
    },
  );
  return receiveDelivery(work, {
    purchaseOrderId,
    receivedOn: work.today,
    lots,
    hardware,
    receiptsSeen: null,
    freight: purchase.freight ?? '0.00',
    duty: '0.00',
    sharedBy: 'value',
    nothingMore: false,
  });
}

export const blankLot = {
  tag: '',
  pieces: 1,
  widthMm: null,
  heightMm: null,
  cost: null,
  grade: 'A',
  place: 'rack 1',
  supplierLot: '',
  weightOz: null,
};

const areaOf = (ft2: string) => convert(ft2, 'ft2', 'mm2').toString();
