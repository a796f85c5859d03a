import type { BodyOf, draftSuggested, GoodsLineTyped } from '@hidewright/contract';
import { Decimal } from 'decimal.js';
import { unscaled } from '../db/columns/scaled-decimal.ts';
import { priceText } from '../http/decimal-text.ts';
import { invalid } from '../http/problem.ts';
import {
  changeDraft,
  draftPurchaseOrder,
} from '../modules/purchase-orders/draft-purchase-order.ts';
import { PurchaseLine } from '../modules/purchase-orders/purchase-line.entity.ts';
import { PurchaseOrder } from '../modules/purchase-orders/purchase-order.entity.ts';
import type { Workshop } from '../modules/workshop/workshop.entity.ts';
import type { Work } from '../work.ts';
import { mergedLine } from './order-suggestions/merged-line.ts';
import { suggestOrders, type Suggested } from './order-suggestions/suggest-orders.ts';

type AskedLine = BodyOf<typeof draftSuggested>['lines'][number];

interface Wanted {
  item: Suggested;
  asked: AskedLine;
}

interface Drafted {
  orderIds: number[];
  notes: string[];
}

const mostLines = 100;

/**
 * Puts what is asked for on the newest draft to its supplier, or on a new one: one draft for each supplier, and one
 * line for each thing. What came on a draft since it was looked at is left alone.
 * @throws {Problem} 422 for a thing that is not bought, or parts of a piece
 */
export async function draftSuggestedOrders(
  work: Work,
  lines: readonly AskedLine[],
): Promise<Drafted> {
  const { items, workshop } = await suggestOrders(work);
  const wanted = lines.map((asked, at) => ({ item: itemFor(items, asked, at), asked }));
  const notes = wanted.flatMap(noteOn);
  const able = wanted.filter((each) => noteOn(each).length === 0);
  const orderIds: number[] = [];
  for (const supplierId of new Set(able.map(({ item }) => item.sold.supplier?.id ?? 0))) {
    const own = able.filter(({ item }) => item.sold.supplier?.id === supplierId);
    const put = await putOnDraft(work, supplierId, { wanted: own, workshop });
    orderIds.push(put.orderId);
    notes.push(...put.notes);
  }
  return { orderIds, notes };
}

function itemFor(items: readonly Suggested[], asked: AskedLine, at: number): Suggested {
  const field = `lines.${at}.id`;
  const item = items.find(({ row }) => row.of === asked.of && row.id === asked.id);
  if (item === undefined) {
    throw invalid([{ field, message: 'Choose something that the shop buys.' }]);
  }
  if (asked.of === 'hardware' && !Number.isInteger(Number(asked.quantity))) {
    throw invalid([{ field: `lines.${at}.quantity`, message: 'Enter whole pieces.' }]);
  }
  return item;
}

function noteOn({ item, asked }: Wanted): string[] {
  const { name } = item.row;
  if (item.sold.supplier === null) {
    return [`${name} has no supplier. Say who sells it, then draft again.`];
  }
  if (new Decimal(asked.drafted).equals(item.amounts.drafted)) return [];
  const drafts = item.open.drafts.map(({ number }) => number).join(' and ');
  return [
    drafts === ''
      ? `${name} is on a draft no more. Look at it again, then draft.`
      : `${name} is on draft ${drafts} by now. Look at it again before you draft more.`,
  ];
}

async function putOnDraft(
  work: Work,
  supplierId: number,
  { wanted, workshop }: { wanted: readonly Wanted[]; workshop: Workshop },
): Promise<{ orderId: number; notes: string[] }> {
  const draft = await newestDraft(work, supplierId);
  const there = draft === null ? [] : await linesOf(work, draft);
  const merged = withWanted(there, wanted, workshop);
  if (draft !== null && merged.lines.length <= mostLines) {
    await changeDraft(work, draft, { lines: merged.lines });
    return { orderId: draft.id, notes: merged.notes };
  }
  const { lines, notes } = withWanted([], wanted, workshop);
  const made = await draftPurchaseOrder(work, {
    supplierId,
    // Worked out when it is sent, from whatever is on it by then.
    expectedOn: null,
    note: '',
    lines,
  });
  return { orderId: made.id, notes };
}

/** A draft that sends leather out to be worked on is left alone: it waits for its lot. */
async function newestDraft({ em }: Work, supplierId: number): Promise<PurchaseOrder | null> {
  const newest = { orderBy: { id: 'desc' } } as const;
  const drafts = await em.find(PurchaseOrder, { supplierId, state: 'draft' }, newest);
  const ids = drafts.map(({ id }) => id);
  const works = await em.find(PurchaseLine, { purchaseOrderId: ids, service: { $ne: null } });
  const busy = new Set(works.map(({ purchaseOrderId }) => purchaseOrderId));
  return drafts.find(({ id }) => !busy.has(id)) ?? null;
}

async function linesOf({ em }: Work, draft: PurchaseOrder): Promise<GoodsLineTyped[]> {
  const lines = await em.find(
    PurchaseLine,
    { purchaseOrderId: draft.id },
    { orderBy: { position: 'asc' } },
  );
  return lines.map(({ leatherId, hardwareId, quantity, unitPrice }): GoodsLineTyped =>
    leatherId === null
      ? { of: 'hardware', hardwareId: hardwareId ?? 0, quantity, unitPrice: priceText(unitPrice) }
      : {
          of: 'leather',
          leatherId,
          areaMm2: unscaled(quantity, 3).toFixed(),
          unitPrice: priceText(unitPrice),
        },
  );
}

/** More of what is on the draft already goes to its line. */
function withWanted(
  lines: readonly GoodsLineTyped[],
  wanted: readonly Wanted[],
  workshop: Workshop,
): { lines: GoodsLineTyped[]; notes: string[] } {
  const all = [...lines];
  const notes: string[] = [];
  for (const { item, asked } of wanted) {
    const at = all.findIndex((line) => isOf(line, asked));
    const merged = mergedLine(item, { there: all[at], more: asked.quantity }, workshop);
    all.splice(at === -1 ? all.length : at, at === -1 ? 0 : 1, merged.line);
    notes.push(...merged.notes);
  }
  return { lines: all, notes };
}

const isOf = (line: GoodsLineTyped, asked: AskedLine): boolean =>
  line.of === 'leather'
    ? asked.of === 'leather' && line.leatherId === asked.id
    : asked.of === 'hardware' && line.hardwareId === asked.id;
