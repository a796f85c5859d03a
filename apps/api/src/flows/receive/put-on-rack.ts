import { Decimal } from 'decimal.js';
import { assignDefined } from '../../db/assign-defined.ts';
import { logDeed } from '../../modules/activity/activity-log.ts';
import { findLot } from '../../modules/lots/find-lot.ts';
import { drawTag, requireFreeTag } from '../../modules/lots/lot-tags.ts';
import { Lot } from '../../modules/lots/lot.entity.ts';
import type { PurchaseLine } from '../../modules/purchase-orders/purchase-line.entity.ts';
import { sayDay } from '../../say-day.ts';
import { receiveStock } from '../../modules/stock/stock-ledger.ts';
import type { Work } from '../../work.ts';
import type { LandedLine } from './price-delivery.ts';

interface Rack {
  receivedOn: string;
  purchaseOrderId: number | null;
}

interface OnRack {
  lotId: number | null;
  hardwareId: number | null;
  movementId: number;
}

/** Writes a line of a delivery into the stock ledger, a lot with its tag; its value bears freight and duty. */
export async function putOnRack(work: Work, line: LandedLine, rack: Rack): Promise<OnRack> {
  const lot = line.of === 'lot' ? await hang(work, line, rack) : null;
  const hardware = line.of === 'hardware' ? line.hardware : null;
  const item = lot === null ? { hardwareId: hardware?.id ?? 0 } : { lotId: lot.id };
  const movement = await receiveStock(work, {
    ...item,
    quantity: line.quantity,
    value: costOf(line),
    purchaseOrderId: rack.purchaseOrderId,
    reason: line.of === 'lot' && line.service ? backFrom(line.service) : cameWith(rack, line.batch),
  });
  await log(work, line, lot);
  return { lotId: lot?.id ?? null, hardwareId: hardware?.id ?? null, movementId: movement.id };
}

/** With freight and duty, and with what it had cost before where it was out for a service. */
const costOf = ({ goods, carriage, material }: LandedLine) => goods.plus(carriage).plus(material);

/**
 * What the ledger says beside goods that came: their batch, by which a failure is traced, and where no order stands
 * there as their paper, the day of the delivery.
 */
export function cameWith({ receivedOn, purchaseOrderId }: Rack, batch: string): string {
  return [
    ...(purchaseOrderId === null ? [`delivery of ${sayDay(receivedOn)}`] : []),
    ...(batch === '' ? [] : [`batch ${batch}`]),
  ].join(', ');
}

const backFrom = ({ service }: PurchaseLine) => `back from ${service ?? ''}`;

/** The lot with its tag, before anything is on hand of it. */
async function hang(
  work: Work,
  line: LandedLine & { of: 'lot' },
  { receivedOn }: Rack,
): Promise<Lot> {
  const { typed, field, leather, purchaseLineId } = line;
  if (typed.tag !== '') await requireFreeTag(work.em, typed.tag, `${field}.tag`);
  const { form, pieces, grade, shade, place, supplierLot, widthMm, heightMm, weightOz } = typed;
  const lot = work.em.create(Lot, {
    tag: typed.tag === '' ? await drawTag(work.em) : typed.tag,
    leatherId: leather.id,
    form,
    pieces,
    measuredAreaMm2: new Decimal(typed.measuredAreaMm2),
    cost: costOf(line),
    receivedOn,
    purchaseLineId,
    parentId: line.service?.fromLotId ?? null,
  });
  assignDefined(lot, { grade, shade, place, supplierLot });
  if (supplierLot === '' && lot.parentId !== null)
    lot.supplierLot = (await findLot(work.em, lot.parentId)).supplierLot;
  if (widthMm !== null) lot.widthMm = new Decimal(widthMm);
  if (heightMm !== null) lot.heightMm = new Decimal(heightMm);
  if (weightOz !== null) lot.weightOz = new Decimal(weightOz);
  await work.em.flush();
  return lot;
}

function log(work: Work, line: LandedLine, lot: Lot | null): Promise<void> {
  if (line.of === 'hardware') {
    const { quantity, hardware, batch } = line;
    return logDeed(work, {
      action: `received ${quantity} × ${hardware.name}`,
      subjectKind: 'hardware',
      subjectId: hardware.id,
      detail: { quantity, ...(batch !== '' && { batch }) },
    });
  }
  const { measuredAreaMm2, markedAreaMm2 } = line.typed;
  return logDeed(work, {
    action: `received lot ${lot?.tag ?? ''} of ${line.leather.name}`,
    subjectKind: 'lot',
    subjectId: lot?.id ?? null,
    detail: { measuredAreaMm2, ...(markedAreaMm2 !== null && { markedAreaMm2 }) },
  });
}
