import { Decimal } from 'decimal.js';
import type {
  addPurchaseOrder,
  BodyOf,
  changePurchaseOrder,
  GoodsLineTyped,
  PurchaseLineTyped,
} from '@hidewright/contract';
import { scaled } from '../../db/columns/scaled-decimal.ts';
import { drawPaperNumber } from '../../db/counters.ts';
import { invalid, notFound, wrongState } from '../../http/problem.ts';
import type { Work } from '../../work.ts';
import { logDeed } from '../activity/activity-log.ts';
import { Hardware } from '../hardware/hardware.entity.ts';
import { Leather } from '../leathers/leather.entity.ts';
import { refuseKit } from '../stock/refuse-kit.ts';
import { Supplier } from '../suppliers/supplier.entity.ts';
import { requireBookable } from './line-amount.ts';
import { noteAwaited } from './note-awaited.ts';
import { PurchaseLine } from './purchase-line.entity.ts';
import { PurchaseOrder } from './purchase-order.entity.ts';
import { keepService, type GoesOut } from './service-line.ts';

/** @throws {Problem} 404 */
export async function findPurchaseOrder(work: Work, id: number): Promise<PurchaseOrder> {
  const order = await work.em.findOne(PurchaseOrder, id);
  if (order === null) throw notFound('purchase order');
  return order;
}

/**
 * Writes a new order to a supplier, to be sent later.
 * @param draftedFor the runs that it is for, in words for the shop alone
 */
export async function draftPurchaseOrder(
  work: Work,
  typed: BodyOf<typeof addPurchaseOrder>,
  draftedFor = '',
): Promise<PurchaseOrder> {
  await requireSupplier(work, typed.supplierId);
  const { supplierId, expectedOn, note } = typed;
  const order = work.em.create(PurchaseOrder, {
    number: await drawPaperNumber(work.em, 'P'),
    supplierId,
    expectedOn,
    note,
    draftedFor,
    state: 'draft',
    createdAt: work.now.toISOString(),
  });
  await work.em.flush();
  await writeLines(work, order, typed.lines);
  await log(work, order, `drafted purchase order ${order.number}`);
  return order;
}

/**
 * Changes an order that has not been sent.
 * @throws {Problem} 409 when it has
 */
export async function changeDraft(
  work: Work,
  order: PurchaseOrder,
  typed: BodyOf<typeof changePurchaseOrder>,
): Promise<void> {
  if (order.state !== 'draft') {
    throw wrongState(
      `${order.number} is ${order.state}; only a draft can be changed. Draft another order.`,
    );
  }
  const { lines, ...plain } = typed;
  if (plain.supplierId !== undefined) await requireSupplier(work, plain.supplierId);
  // Names a field in any case, so that the version rises when only lines change.
  const fields = { note: order.note, ...withoutUndefined(plain) };
  await work.em.nativeUpdate(PurchaseOrder, { id: order.id }, fields);
  await work.em.refresh(order);
  if (lines !== undefined) {
    await work.em.nativeDelete(PurchaseLine, { purchaseOrderId: order.id });
    await writeLines(work, order, lines);
  }
  await log(work, order, `changed purchase order ${order.number}`, { changed: Object.keys(typed) });
}

/**
 * Cancels an order of which nothing has come.
 * @throws {Problem} 409 when something has, or when it is closed already
 */
export async function cancelPurchaseOrder(
  work: Work,
  order: PurchaseOrder,
  reason: string,
): Promise<void> {
  if (order.state === 'part received') {
    const sentence = `Part of ${order.number} has come. Receive it with “nothing more is to come” instead.`;
    throw wrongState(sentence, ['receive']);
  }
  if (order.state !== 'draft' && order.state !== 'sent') {
    throw wrongState(`${order.number} is ${order.state} already; there is nothing left to cancel.`);
  }
  const from = order.state;
  order.state = 'cancelled';
  await noteAwaited(work, order);
  await log(work, order, `cancelled purchase order ${order.number}`, {
    from,
    to: 'cancelled',
    reason,
  });
}

function withoutUndefined<T extends object>(
  typed: T,
): { [K in keyof T]: Exclude<T[K], undefined> } {
  const entries = Object.entries(typed).filter(([, value]) => value !== undefined);
  return Object.fromEntries(entries) as { [K in keyof T]: Exclude<T[K], undefined> };
}

async function writeLines(
  work: Work,
  order: PurchaseOrder,
  lines: PurchaseLineTyped[],
): Promise<void> {
  const kept: Kept[] = [];
  const goesOut: GoesOut = new Map();
  for (const [at, line] of lines.entries())
    kept.push(await toKept(work, line, { field: `lines.${at}`, goesOut }));
  requireBookable(kept);
  for (const [at, line] of kept.entries()) {
    work.em.create(PurchaseLine, { ...line, purchaseOrderId: order.id, position: at + 1 });
  }
  await work.em.flush();
}

type Kept = Pick<PurchaseLine, 'leatherId' | 'hardwareId' | 'quantity' | 'unitPrice'> &
  Partial<Pick<PurchaseLine, 'service' | 'fromLotId' | 'fixedPrice'>>;

/** A line as its table keeps it: leather in thousandths of mm², hardware in pieces. */
async function toKept(
  work: Work,
  line: PurchaseLineTyped,
  within: { field: string; goesOut: GoesOut },
): Promise<Kept> {
  if (line.of === 'service') return keepService(work, line, within);
  await requireThing(work, line, within.field);
  const unitPrice = new Decimal(line.unitPrice);
  return line.of === 'leather'
    ? {
        leatherId: line.leatherId,
        hardwareId: null,
        quantity: scaled(new Decimal(line.areaMm2), 3),
        unitPrice,
      }
    : { leatherId: null, hardwareId: line.hardwareId, quantity: line.quantity, unitPrice };
}

async function requireThing(work: Work, line: GoodsLineTyped, field: string): Promise<void> {
  if (line.of === 'leather') {
    if ((await work.em.findOne(Leather, line.leatherId)) !== null) return;
    throw invalid([{ field: `${field}.leatherId`, message: 'Choose a leather from the list.' }]);
  }
  const hardwareId = `${field}.hardwareId`;
  if ((await work.em.findOne(Hardware, line.hardwareId)) === null)
    throw invalid([{ field: hardwareId, message: 'Choose hardware or supplies from the list.' }]);
  await refuseKit(work.em, line, hardwareId);
}

async function requireSupplier(work: Work, id: number): Promise<void> {
  if ((await work.em.findOne(Supplier, id)) !== null) return;
  throw invalid([{ field: 'supplierId', message: 'Choose a supplier from the list.' }]);
}

function log(
  work: Work,
  order: PurchaseOrder,
  action: string,
  detail: Record<string, unknown> = {},
): Promise<void> {
  return logDeed(work, { action, subjectKind: 'purchase order', subjectId: order.id, detail });
}
