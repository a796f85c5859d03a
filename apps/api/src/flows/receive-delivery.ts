import { Decimal } from 'decimal.js';
import type { BodyOf, receiveDelivery as endpoint, ReplyOf } from '@hidewright/contract';
import { invalid, type FieldFault } from '../http/problem.ts';
import { logDeed } from '../modules/activity/activity-log.ts';
import { readOneHardware } from '../modules/hardware/read-hardware.ts';
import { readOneLot } from '../modules/lots/read-lots.ts';
import { OpenDelivery } from '../modules/purchase-orders/open-delivery.ts';
import { priceDifferenceOf } from '../modules/purchase-orders/paid-for-lines.ts';
import { readOnePurchaseOrder } from '../modules/purchase-orders/read-purchase-orders.ts';
import { missingAreaOf } from '../modules/receipts/missing-area.ts';
import { readOneReceipt } from '../modules/receipts/read-receipts.ts';
import { ReceiptLine } from '../modules/receipts/receipt-line.entity.ts';
import { Receipt } from '../modules/receipts/receipt.entity.ts';
import { Workshop } from '../modules/workshop/workshop.entity.ts';
import type { Work } from '../work.ts';
import {
  priceHardware,
  priceLot,
  withCarriage,
  type PricedLine,
} from './receive/price-delivery.ts';
import { withServices } from './receive/price-services.ts';
import { putOnRack } from './receive/put-on-rack.ts';
import { putLotsBack } from './services/put-lots-back.ts';

type Delivery = BodyOf<typeof endpoint>;

interface Received {
  receiptId: number | null;
  purchaseOrderId: number | null;
}

/**
 * Takes in what a supplier brought: lots with their tags and measured areas, hardware by count, each at what it cost
 * with its share of freight and duty. For an order, its lines fill up and its state follows; leather that was out for a
 * service is a new lot under the one that went.
 * @throws {Problem} 409 when the order awaits nothing or somebody was quicker, 422 where what was typed cannot be
 */
export async function receiveDelivery(work: Work, asked: Delivery): Promise<Received> {
  requireSense(work, asked);
  const { purchaseOrderId, nothingMore } = asked;
  const delivery = await OpenDelivery.begin(work, purchaseOrderId, asked.receiptsSeen);
  const came = asked.lots.length + asked.hardware.length > 0;
  const receiptId = came ? await takeIn(work, delivery, asked) : null;
  await delivery.finish({ came, nothingMore });
  if (delivery.order !== null && nothingMore) await putLotsBack(work, delivery.order);
  return { receiptId, purchaseOrderId };
}

async function takeIn(work: Work, delivery: OpenDelivery, asked: Delivery): Promise<number> {
  const receivedOn = asked.receivedOn ?? work.today;
  const priced: PricedLine[] = [];
  for (const [at, typed] of asked.lots.entries())
    priced.push(await priceLot(work, delivery, typed, `lots.${at}`));
  for (const [at, typed] of asked.hardware.entries())
    priced.push(await priceHardware(work, delivery, typed, `hardware.${at}`));
  const told = await withServices(work, priced);
  const receipt = await writeReceipt(work, asked, { receivedOn, came: told });
  for (const [at, line] of withCarriage(told, asked).entries()) {
    const rack = { receivedOn, purchaseOrderId: asked.purchaseOrderId };
    const { lotId, hardwareId, movementId } = await putOnRack(work, line, rack);
    work.em.create(ReceiptLine, {
      receiptId: receipt.id,
      position: at + 1,
      purchaseLineId: line.purchaseLineId,
      lotId,
      hardwareId,
      quantity: line.quantity,
      markedAreaMm2: line.markedAreaMm2,
      batch: line.batch,
      goods: line.goods,
      carriage: line.carriage,
      material: line.material,
      movementId,
    });
  }
  await work.em.flush();
  await logDeed(work, {
    action: `received a delivery of ${asked.lots.length} lots and ${asked.hardware.length} kinds of hardware`,
    subjectKind: 'delivery',
    subjectId: receipt.id,
    detail: { purchaseOrderId: asked.purchaseOrderId },
  });
  return receipt.id;
}

interface Came {
  receivedOn: string;
  came: PricedLine[];
}

async function writeReceipt(
  work: Work,
  asked: Delivery,
  { receivedOn, came }: Came,
): Promise<Receipt> {
  const { areaTolerancePercent } = await work.em.findOneOrFail(Workshop, 1);
  const receipt = work.em.create(Receipt, {
    purchaseOrderId: asked.purchaseOrderId,
    receivedOn,
    at: work.now.toISOString(),
    freight: new Decimal(asked.freight),
    duty: new Decimal(asked.duty),
    sharedBy: asked.sharedBy,
    tolerancePercent: areaTolerancePercent,
    priceDifference: await priceDifferenceOf(work.em, came),
    missingAreaMm2: missingAreaOf(came, areaTolerancePercent),
    actorId: work.actor.id,
    actorName: work.actor.name,
  });
  await work.em.flush();
  return receipt;
}

/** What a delivery made, as it now stands. */
export async function describeReceipt(
  work: Work,
  { receiptId, purchaseOrderId }: Received,
): Promise<ReplyOf<typeof endpoint>> {
  const receipt = receiptId === null ? null : await readOneReceipt(work.em, receiptId);
  const lots = [];
  for (const { lotId } of receipt?.lines ?? [])
    if (lotId !== null) lots.push(await readOneLot(work.em, lotId));
  const hardwareIds = new Set(receipt?.lines.flatMap((line) => line.hardwareId ?? []));
  const hardware = [];
  for (const id of hardwareIds) hardware.push(await readOneHardware(work.em, id));
  const purchaseOrder =
    purchaseOrderId === null ? null : await readOnePurchaseOrder(work, purchaseOrderId);
  return { receipt, lots, hardware, purchaseOrder };
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
  if (empty) faults.push(...typedCarriage(asked, 'Add what came before its freight and duty.'));
  if (work.actor.role === 'maker') {
    faults.push(...typedCosts(asked), ...typedCarriage(asked, 'Leave the cost to the owner.'));
  }
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

function typedCarriage(asked: Delivery, message: string): FieldFault[] {
  return (['freight', 'duty'] as const)
    .filter((field) => Number(asked[field]) > 0)
    .map((field) => ({ field, message }));
}
