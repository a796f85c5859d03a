import type { receiveDelivery } from '@hidewright/contract';
import type { PurchaseLine, PurchaseOrder } from '@hidewright/contract';
import { Decimal } from 'decimal.js';
import type { z } from 'zod';

export type TypedDelivery = z.input<NonNullable<typeof receiveDelivery.body>>;
export type TypedLot = NonNullable<TypedDelivery['lots']>[number];
export type TypedHardware = NonNullable<TypedDelivery['hardware']>[number];

const unanswered = '' as unknown as number;

/** What is still to come of a line: thousandths of a foot matter to nobody, a negative rest neither. */
export function openOf(line: PurchaseLine): { areaMm2: string } | { quantity: number } {
  if (line.areaMm2 === null)
    return { quantity: Math.max(0, (line.quantity ?? 0) - (line.received ?? 0)) };
  const rest = new Decimal(line.areaMm2).minus(line.receivedAreaMm2 ?? '0');
  return { areaMm2: Decimal.max(0, rest).toFixed() };
}

export function isOpen(line: PurchaseLine): boolean {
  const open = openOf(line);
  return 'quantity' in open ? open.quantity > 0 : open.areaMm2 !== '0';
}

/** A lot to be filled in; of an order's line, or of a leather, if that is known. */
export function blankLot(leatherId: number | undefined, purchaseLineId: number | null): TypedLot {
  return {
    leatherId: leatherId ?? unanswered,
    purchaseLineId,
    tag: '',
    form: 'side',
    measuredAreaMm2: '',
    pieces: 1,
    widthMm: null,
    heightMm: null,
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
    cost: null,
  };
}

/** A delivery as it is expected: a lot for each open line of leather, and the counts that are still to come. */
export function deliveryOf(order: PurchaseOrder, today: string): TypedDelivery {
  const open = order.lines.filter(isOpen);
  return {
    ...blankDelivery(today),
    purchaseOrderId: order.id,
    lots: open.flatMap((line) =>
      line.leatherId === null ? [] : [blankLot(line.leatherId, line.id)],
    ),
    hardware: open.flatMap((line) => {
      const rest = openOf(line);
      return line.hardwareId === null || !('quantity' in rest)
        ? []
        : [blankHardware(line.hardwareId, line.id, rest.quantity)];
    }),
  };
}

export function blankDelivery(today: string): TypedDelivery {
  return { purchaseOrderId: null, receivedOn: today, lots: [], hardware: [], nothingMore: false };
}
