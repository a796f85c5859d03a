import { Decimal } from 'decimal.js';
import type {
  BodyOf,
  ReceivedHardware,
  receiveDelivery as endpoint,
  ReceivedLot,
  ReplyOf,
} from '@hidewright/contract';
import { assignDefined } from '../db/assign-defined.ts';
import { scaled } from '../db/columns/scaled-decimal.ts';
import { invalid, type FieldFault } from '../http/problem.ts';
import { logDeed } from '../modules/activity/activity-log.ts';
import { Hardware } from '../modules/hardware/hardware.entity.ts';
import { readOneHardware } from '../modules/hardware/read-hardware.ts';
import { Leather } from '../modules/leathers/leather.entity.ts';
import { drawTag, requireFreeTag } from '../modules/lots/lot-tags.ts';
import { Lot } from '../modules/lots/lot.entity.ts';
import { readOneLot } from '../modules/lots/read-lots.ts';
import { hardwareCost, leatherCost } from '../modules/purchase-orders/line-amount.ts';
import { OpenDelivery } from '../modules/purchase-orders/open-delivery.ts';
import { readOnePurchaseOrder } from '../modules/purchase-orders/read-purchase-orders.ts';
import { receiveStock } from '../modules/stock/stock-ledger.ts';
import type { Work } from '../work.ts';

type Delivery = BodyOf<typeof endpoint>;

interface Receipt {
  lotIds: number[];
  hardwareIds: number[];
  purchaseOrderId: number | null;
}

/**
 * Takes in what a supplier brought: lots with their tags and measured areas, hardware by count, each at its cost. For
 * an order, its lines fill up and its state follows.
 * @throws {Problem} 409 when the order awaits nothing, 422 where what was typed cannot be
 */
export async function receiveDelivery(work: Work, asked: Delivery): Promise<Receipt> {
  requireSense(work, asked);
  const delivery = await OpenDelivery.begin(work, asked.purchaseOrderId);
  const receipt: Receipt = { lotIds: [], hardwareIds: [], purchaseOrderId: asked.purchaseOrderId };
  for (const [at, typed] of asked.lots.entries()) {
    const lot = await receiveLot(work, delivery, typed, {
      field: `lots.${at}`,
      on: asked.receivedOn ?? work.today,
    });
    receipt.lotIds.push(lot.id);
  }
  for (const [at, typed] of asked.hardware.entries()) {
    await receiveHardware(work, delivery, typed, `hardware.${at}`);
    receipt.hardwareIds.push(typed.hardwareId);
  }
  await delivery.finish(asked.nothingMore);
  return receipt;
}

/** What a receipt made, as it now stands. */
export async function describeReceipt(
  work: Work,
  receipt: Receipt,
): Promise<ReplyOf<typeof endpoint>> {
  const { lotIds, hardwareIds, purchaseOrderId } = receipt;
  const lots = [];
  for (const id of lotIds) lots.push(await readOneLot(work.em, id));
  const hardware = [];
  for (const id of new Set(hardwareIds)) hardware.push(await readOneHardware(work.em, id));
  const purchaseOrder =
    purchaseOrderId === null ? null : await readOnePurchaseOrder(work.em, purchaseOrderId);
  return { lots, hardware, purchaseOrder };
}

function requireSense(work: Work, asked: Delivery): void {
  const faults: FieldFault[] = [];
  const empty = asked.lots.length + asked.hardware.length === 0;
  if (empty && !(asked.nothingMore && asked.purchaseOrderId !== null)) {
    faults.push({ field: 'lots', message: 'Add what came: a lot, or hardware.' });
  }
  if (asked.receivedOn !== undefined && asked.receivedOn > work.today) {
    faults.push({ field: 'receivedOn', message: 'Choose today or an earlier day.' });
  }
  if (work.actor.role === 'maker') faults.push(...typedCosts(asked));
  if (faults.length > 0) throw invalid(faults);
}

function typedCosts(asked: Delivery): FieldFault[] {
  return (['lots', 'hardware'] as const).flatMap((list) =>
    asked[list].flatMap(({ cost }, at) =>
      cost === null
        ? []
        : [{ field: `${list}.${at}.cost`, message: 'Leave the cost to the owner.' }],
    ),
  );
}

async function receiveLot(
  work: Work,
  delivery: OpenDelivery,
  typed: ReceivedLot,
  { field, on }: { field: string; on: string },
): Promise<Lot> {
  const leather = await work.em.findOne(Leather, typed.leatherId);
  if (leather === null)
    throw invalid([{ field: `${field}.leatherId`, message: 'Choose a leather from the list.' }]);
  const area = new Decimal(typed.measuredAreaMm2);
  const line = delivery.fill(typed, scaled(area, 3), field);
  const cost =
    typed.cost === null
      ? leatherCost(area, line?.unitPrice ?? leather.pricePerFt2, `${field}.cost`)
      : new Decimal(typed.cost);
  const lot = await hang(work, typed, { field, on, area, cost, purchaseLineId: line?.id ?? null });
  await receiveStock(work, {
    lotId: lot.id,
    quantity: scaled(area, 3),
    value: cost,
    purchaseOrderId: delivery.orderId,
  });
  await logDeed(work, {
    action: `received lot ${lot.tag} of ${leather.name}`,
    subjectKind: 'lot',
    subjectId: lot.id,
    detail: { measuredAreaMm2: typed.measuredAreaMm2 },
  });
  return lot;
}

interface Hung {
  field: string;
  on: string;
  area: Decimal;
  cost: Decimal;
  purchaseLineId: number | null;
}

/** The lot with its tag, before anything is on hand of it. */
async function hang(
  work: Work,
  typed: ReceivedLot,
  { field, on, area, cost, purchaseLineId }: Hung,
): Promise<Lot> {
  if (typed.tag !== '') await requireFreeTag(work.em, typed.tag, `${field}.tag`);
  const { leatherId, form, pieces, grade, shade, place, supplierLot, widthMm, heightMm } = typed;
  const lot = work.em.create(Lot, {
    tag: typed.tag === '' ? await drawTag(work.em) : typed.tag,
    leatherId,
    form,
    pieces,
    measuredAreaMm2: area,
    cost,
    receivedOn: on,
    purchaseLineId,
  });
  assignDefined(lot, { grade, shade, place, supplierLot });
  if (widthMm !== null) lot.widthMm = new Decimal(widthMm);
  if (heightMm !== null) lot.heightMm = new Decimal(heightMm);
  await work.em.flush();
  return lot;
}

async function receiveHardware(
  work: Work,
  delivery: OpenDelivery,
  typed: ReceivedHardware,
  field: string,
): Promise<void> {
  const hardware = await work.em.findOne(Hardware, typed.hardwareId);
  if (hardware === null) {
    throw invalid([
      { field: `${field}.hardwareId`, message: 'Choose hardware or supplies from the list.' },
    ]);
  }
  const { quantity } = typed;
  const line = delivery.fill(typed, quantity, field);
  const value =
    typed.cost === null
      ? hardwareCost(quantity, line?.unitPrice ?? hardware.unitPrice, `${field}.cost`)
      : new Decimal(typed.cost);
  await receiveStock(work, {
    hardwareId: hardware.id,
    quantity,
    value,
    purchaseOrderId: delivery.orderId,
  });
  await logDeed(work, {
    action: `received ${quantity} × ${hardware.name}`,
    subjectKind: 'hardware',
    subjectId: hardware.id,
    detail: { quantity },
  });
}
