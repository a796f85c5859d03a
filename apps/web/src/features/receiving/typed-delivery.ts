import type { receiveDelivery } from '@hidewright/contract';
import type { PurchaseLine, PurchaseOrder } from '@hidewright/contract';
import type { z } from 'zod';

export type TypedDelivery = z.input<NonNullable<typeof receiveDelivery.body>>;
export type TypedLot = NonNullable<TypedDelivery['lots']>[number];
export type TypedHardware = NonNullable<TypedDelivery['hardware']>[number];

const unanswered = '' as unknown as number;

export const isOpen = ({ toCome }: PurchaseLine): boolean =>
  (toCome.quantity ?? 0) > 0 || Number(toCome.areaMm2 ?? 0) > 0;

/** A lot to be filled in; of an order's line, or of a leather, if that is known. */
export function blankLot(leatherId: number | undefined, purchaseLineId: number | null): TypedLot {
  return {
    leatherId: leatherId ?? unanswered,
    purchaseLineId,
    tag: '',
    form: 'side',
    markedAreaMm2: null,
    measuredAreaMm2: '',
    pieces: 1,
    widthMm: null,
    heightMm: null,
    weightOz: null,
    cost: null,
    grade: '',
    shade: '',
    place: '',
    supplierLot: '',
  };
}

export function blankHardware(
  hardwareId: number | undefined,
  purchaseLineId: number | null,
  quantity?: number,
): TypedHardware {
  return {
    hardwareId: hardwareId ?? unanswered,
    purchaseLineId,
    quantity: quantity ?? unanswered,
    batch: '',
    cost: null,
  };
}

/** What comes back from a service, as it was before but for its leather, with its area to be measured anew. */
export function lotBack({ id, service }: PurchaseLine, measuredAreaMm2: string): TypedLot {
  const blank = blankLot(service?.becomesLeatherId, id);
  return { ...blank, form: service?.lotForm ?? blank.form, measuredAreaMm2 };
}

/** The next lot after one of the same leather: as a rule it has the same form and shade, and hangs beside it. */
export function nextLot(before: TypedLot | undefined, blank: TypedLot): TypedLot {
  if (before === undefined) return blank;
  const { form, shade = '', grade = '', place = '', supplierLot = '' } = before;
  return { ...blank, form, shade, grade, place, supplierLot };
}

/** A delivery as it is expected: a lot for each open line of leather, and the counts that are still to come. */
export function deliveryOf(order: PurchaseOrder, today: string): TypedDelivery {
  const open = order.lines.filter(isOpen);
  return {
    ...blankDelivery(today),
    purchaseOrderId: order.id,
    receiptsSeen: order.receipts,
    lots: open.flatMap((line) => {
      if (line.service !== null) return [lotBack(line, line.toCome.areaMm2 ?? '')];
      return line.leatherId === null ? [] : [blankLot(line.leatherId, line.id)];
    }),
    hardware: open.flatMap((line) =>
      line.hardwareId === null
        ? []
        : [blankHardware(line.hardwareId, line.id, line.toCome.quantity ?? undefined)],
    ),
  };
}

/**
 * What was typed, after somebody else received of the same order: what is complete now is taken out, a count is no
 * more than what is still to come, and lots stay as they are while some of their leather is awaited.
 */
export function withoutWhatCame(typed: TypedDelivery, order: PurchaseOrder): TypedDelivery {
  const open = new Map(order.lines.filter(isOpen).map((line) => [line.id, line]));
  const awaited = ({ purchaseLineId = null }: { purchaseLineId?: number | null | undefined }) =>
    purchaseLineId === null || open.has(purchaseLineId);
  const rest = (row: TypedHardware): TypedHardware => {
    const most = open.get(row.purchaseLineId ?? 0)?.toCome.quantity;
    return most === undefined || most === null || row.quantity <= most
      ? row
      : { ...row, quantity: most };
  };
  return {
    ...typed,
    receiptsSeen: order.receipts,
    lots: (typed.lots ?? []).filter(awaited),
    hardware: (typed.hardware ?? []).filter(awaited).map(rest),
  };
}

export function blankDelivery(today: string): TypedDelivery {
  return {
    purchaseOrderId: null,
    receiptsSeen: null,
    receivedOn: today,
    lots: [],
    hardware: [],
    freight: '0.00',
    duty: '0.00',
    sharedBy: 'value',
    nothingMore: false,
  };
}
