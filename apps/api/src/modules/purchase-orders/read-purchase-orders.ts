import { Decimal } from 'decimal.js';
import type { FilterQuery } from '@mikro-orm/core';
import type { PurchaseLine as LineReply, PurchaseOrder as OrderReply } from '@hidewright/contract';
import { unscaled } from '../../db/columns/scaled-decimal.ts';
import { moneyText, priceText } from '../../http/decimal-text.ts';
import { notFound } from '../../http/problem.ts';
import type { Work } from '../../work.ts';
import { Supplier } from '../suppliers/supplier.entity.ts';
import { lineProgress } from '@hidewright/domain';
import { readArticleNumbers, type ArticleNumberOf } from './article-numbers.ts';
import { readCancellations, type Cancellations } from './cancellations.ts';
import { readDraftArrivals } from './draft-arrivals.ts';
import { lineAmount } from './line-amount.ts';
import { nameOf, readLineNames, serviceOf, wholeOf, type LineNames } from './line-names.ts';
import { PurchaseLine } from './purchase-line.entity.ts';
import { measuredOf, paidOf, readPaid, type Paid } from './paid-for-lines.ts';
import { PurchaseOrder } from './purchase-order.entity.ts';
import { readSentBack, type SentBackOfLines } from './sent-back-of-lines.ts';

/** Orders with their lines and every name in them, newest first. */
export async function readPurchaseOrderList(
  work: Pick<Work, 'em' | 'today'>,
  where: FilterQuery<PurchaseOrder>,
  limit: number,
): Promise<OrderReply[]> {
  const { em } = work;
  const orders = await em.find(PurchaseOrder, where, { orderBy: { id: 'desc' }, limit });
  const lines = await em.find(
    PurchaseLine,
    { purchaseOrderId: orders.map((order) => order.id) },
    { orderBy: { position: 'asc' } },
  );
  const names = await readLineNames(em, lines);
  const articleNumberOf = await readArticleNumbers(em, orders, lines);
  const paid = await readPaid(em, lines);
  const arrivals = await readDraftArrivals(work, orders);
  const cancellations = await readCancellations(em, orders);
  const sentBack = await readSentBack(
    em,
    orders.map((order) => order.id),
  );
  const suppliers = await byId(em.find(Supplier, { id: orders.map((order) => order.supplierId) }));
  return orders.map((order) => {
    const own = lines.filter((line) => line.purchaseOrderId === order.id);
    return toReply(order, suppliers.get(order.supplierId), own, {
      names,
      articleNumberOf,
      paid,
      arrivals,
      cancellations,
      sentBack,
    });
  });
}

/** @throws {Problem} 404 */
export async function readOnePurchaseOrder(
  work: Pick<Work, 'em' | 'today'>,
  id: number,
): Promise<OrderReply> {
  const [found] = await readPurchaseOrderList(work, { id }, 1);
  if (found === undefined) throw notFound('purchase order');
  return found;
}

async function byId<T extends { id: number }>(rows: Promise<T[]>): Promise<Map<number, T>> {
  return new Map((await rows).map((row) => [row.id, row]));
}

interface Known {
  names: LineNames;
  articleNumberOf: ArticleNumberOf;
  paid: Paid;
  arrivals: ReadonlyMap<number, string>;
  cancellations: Cancellations;
  sentBack: SentBackOfLines;
}

function toReply(
  order: PurchaseOrder,
  supplier: Supplier | undefined,
  lines: PurchaseLine[],
  known: Known,
): OrderReply {
  return {
    id: order.id,
    number: order.number,
    supplierId: order.supplierId,
    supplierName: supplier?.name ?? '',
    supplierEmail: supplier?.email ?? '',
    state: order.state,
    createdAt: order.createdAt,
    sentAt: order.sentAt,
    expectedOn: order.expectedOn,
    arrivesOn: known.arrivals.get(order.id) ?? null,
    awaitedOn: awaitedOn(order, lines),
    cancellation: known.cancellations.get(order.id) ?? null,
    note: order.note,
    draftedFor: order.draftedFor,
    lines: lines.map((line) => toLine(line, order, known)),
    receipts: order.receipts,
    total: moneyText(lines.reduce((sum, line) => sum.plus(lineAmount(line)), new Decimal(0))),
    version: order.version,
  };
}

function toLine(line: PurchaseLine, order: PurchaseOrder, known: Known): LineReply {
  const { names, paid } = known;
  const ofLeather = line.leatherId !== null;
  const area = (thousandths: number) => (ofLeather ? unscaled(thousandths, 3).toFixed() : null);
  const pieces = (quantity: number) => (ofLeather ? null : quantity);
  const goods = (quantity: number) => ({ areaMm2: area(quantity), quantity: pieces(quantity) });
  const { toCome, over, short } = progressOf(line, order);
  const sentBack = known.sentBack.get(line.id);
  const measured = measuredOf(paid, line);
  return {
    id: line.id,
    position: line.position,
    ...whatOf(line),
    name: nameOf(line, names),
    articleNumber: known.articleNumberOf(order.supplierId, line),
    unit: names.hardware.get(line.hardwareId ?? 0)?.unit ?? null,
    service: serviceOf(line, order, names),
    areaMm2: area(line.quantity),
    receivedAreaMm2: area(line.received),
    measuredAreaMm2: measured === null ? null : area(measured),
    whole: wholeOf(line, names),
    quantity: pieces(line.quantity),
    received: pieces(line.received),
    toCome: goods(toCome),
    over: goods(over),
    short: goods(short),
    sentBack: sentBack === undefined ? null : { ...sentBack, ...goods(sentBack.quantity) },
    expectedOn: line.expectedOn ?? order.expectedOn,
    unitPrice: priceText(line.unitPrice),
    fixedPrice: line.fixedPrice === null ? null : moneyText(line.fixedPrice),
    amount: moneyText(lineAmount(line)),
    ...paidOf(paid, line),
  };
}

/** A service names no goods: what it becomes stands with it. */
function whatOf({ service, leatherId, hardwareId }: PurchaseLine) {
  if (service !== null) return { of: 'service' as const, leatherId: null, hardwareId: null };
  const of = leatherId === null ? ('hardware' as const) : ('leather' as const);
  return { of, leatherId, hardwareId };
}

function awaitedOn(order: PurchaseOrder, lines: PurchaseLine[]): string | null {
  if (order.state !== 'sent' && order.state !== 'part received') return null;
  const days = lines
    .filter(({ received, quantity, closed }) => received < quantity && !closed)
    .flatMap((line) => line.expectedOn ?? order.expectedOn ?? []);
  return days.sort()[0] ?? null;
}

/**
 * A draft awaits all of itself; of a cancelled order nothing is missing. What comes back of a service is measured
 * anew and may be split in two: it is neither over nor short.
 */
function progressOf(line: PurchaseLine, { state }: PurchaseOrder) {
  const { quantity, received, closed, service } = line;
  if (service !== null) {
    const open = received === 0 && !closed && state !== 'cancelled' && state !== 'received';
    return { toCome: open ? quantity : 0, over: 0, short: 0 };
  }
  const ordered = state === 'cancelled' ? received : quantity;
  return lineProgress({ ordered, received }, state !== 'received' && !closed);
}
