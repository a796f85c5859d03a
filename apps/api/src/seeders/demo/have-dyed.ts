import { addDays, convert } from '@hidewright/domain';
import { Decimal } from 'decimal.js';
import { putPurchaseOrderOnPaper } from '../../flows/put-purchase-order-on-paper.ts';
import { describeReceipt, receiveDelivery } from '../../flows/receive-delivery.ts';
import { sendPurchaseOrder } from '../../flows/send-purchase-order.ts';
import { logDeed } from '../../modules/activity/activity-log.ts';
import { Leather } from '../../modules/leathers/leather.entity.ts';
import { draftPurchaseOrder } from '../../modules/purchase-orders/draft-purchase-order.ts';
import { Supplier } from '../../modules/suppliers/supplier.entity.ts';
import type { Work } from '../../work.ts';
import { blankLot } from './buy.ts';
import type { DemoShop } from './demo-shop.ts';
import { dyeing, dyeWorks, shoulders } from './scenario/dyeing.ts';
import type { Year } from './year.ts';

/** On the last morning a shoulder came in, and went out to be dyed; no pattern is cut from it yet. */
export function planDyeing(shop: DemoShop, year: Year): void {
  year.plan(0, '07:45', async () => {
    const id = await shop.as('owner', draft);
    const drawn = await putPurchaseOrderOnPaper(shop.context, shop.person('owner'), id);
    await shop.as('owner', (work) =>
      sendPurchaseOrder(work, { id, by: 'hand', mailIsSet: true }, drawn),
    );
  });
}

async function draft(work: Work): Promise<number> {
  const supplier = work.em.create(Supplier, dyeWorks);
  await note(work, 'supplier', supplier);
  const before = await addLeather(work, shoulders.before);
  const after = await addLeather(work, shoulders.after);
  const order = await draftPurchaseOrder(work, {
    supplierId: supplier.id,
    expectedOn: addDays(work.today, dyeWorks.leadDays),
    note: 'Deep black, through and through, please.',
    lines: [
      {
        ...{ of: 'service', service: 'dyeing', lotId: await hang(work, before) },
        ...{ becomesLeatherId: after.id, unitPrice: dyeing.pricePerFt2 },
      },
    ],
  });
  return order.id;
}

type Shoulder = (typeof shoulders)['before' | 'after'];

async function addLeather(work: Work, typed: Shoulder): Promise<Leather> {
  const leather = work.em.create(Leather, {
    ...typed,
    weightLowOz: new Decimal(typed.weightLowOz),
    weightHighOz: new Decimal(typed.weightHighOz),
    pricePerFt2: new Decimal(typed.pricePerFt2),
    wholeAreaMm2: new Decimal(typed.wholeAreaMm2),
  });
  await note(work, 'leather', leather);
  return leather;
}

async function hang(work: Work, { id: leatherId }: Leather): Promise<number> {
  const lot = {
    ...blankLot,
    ...({ leatherId, purchaseLineId: null, form: 'shoulder', shade: 'pale' } as const),
    measuredAreaMm2: convert(dyeing.areaFt2, 'ft2', 'mm2').toString(),
    markedAreaMm2: null,
    place: dyeing.place,
  };
  const received = await receiveDelivery(work, {
    purchaseOrderId: null,
    receivedOn: work.today,
    lots: [lot],
    hardware: [],
    receiptsSeen: null,
    freight: '0.00',
    duty: '0.00',
    sharedBy: 'value',
    nothingMore: false,
  });
  const { lots } = await describeReceipt(work, received);
  return lots[0]?.id ?? 0;
}

async function note(
  work: Work,
  subjectKind: string,
  made: { id: number; name: string },
): Promise<void> {
  await work.em.flush();
  const action = `added ${subjectKind} ${made.name}`;
  await logDeed(work, { action, subjectKind, subjectId: made.id });
}
