import type { GoodsLineTyped } from '@hidewright/contract';
import { unscaled } from '../../db/columns/scaled-decimal.ts';
import { priceText } from '../../http/decimal-text.ts';
import {
  changeDraft,
  draftPurchaseOrder,
} from '../../modules/purchase-orders/draft-purchase-order.ts';
import { PurchaseLine } from '../../modules/purchase-orders/purchase-line.entity.ts';
import { PurchaseOrder } from '../../modules/purchase-orders/purchase-order.entity.ts';
import type { Workshop } from '../../modules/workshop/workshop.entity.ts';
import type { Work } from '../../work.ts';
import { mergedLine, type MoreOf } from './merged-line.ts';

interface ToPut {
  supplierId: number;
  things: readonly MoreOf[];
  areaUnit: Workshop['areaUnit'];
  /** The runs that it is for, in words for the shop alone; empty where it is for none. */
  draftedFor?: string;
}

const mostLines = 100;

/**
 * Puts things on the newest draft to their supplier, or on a new one: one draft for each supplier, and one line for each
 * thing, so that what is bought together reaches the price breaks together.
 */
export async function putOnDraft(
  work: Work,
  { supplierId, things, areaUnit, draftedFor = '' }: ToPut,
): Promise<{ order: PurchaseOrder; notes: string[] }> {
  const draft = await newestDraft(work, supplierId);
  const there = draft === null ? [] : await linesOf(work, draft);
  const merged = withMore(there, things, areaUnit);
  if (draft !== null && merged.lines.length <= mostLines) {
    draft.draftedFor = joined(draft.draftedFor, draftedFor);
    await work.em.flush();
    await changeDraft(work, draft, { lines: merged.lines });
    return { order: draft, notes: merged.notes };
  }
  const { lines, notes } = withMore([], things, areaUnit);
  // The day is worked out when it is sent, from whatever is on it by then.
  const typed = { supplierId, expectedOn: null, note: '', lines };
  return { order: await draftPurchaseOrder(work, typed, draftedFor), notes };
}

/** Each run once, however often something was drafted for it. */
const joined = (before: string, more: string): string =>
  [...new Set([before, more].flatMap((all) => all.split('; ')))].filter(Boolean).join('; ');

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
function withMore(
  lines: readonly GoodsLineTyped[],
  things: readonly MoreOf[],
  areaUnit: Workshop['areaUnit'],
): { lines: GoodsLineTyped[]; notes: string[] } {
  const all = [...lines];
  const notes: string[] = [];
  for (const thing of things) {
    const at = all.findIndex((line) => isOf(line, thing));
    const merged = mergedLine(thing, all[at], areaUnit);
    all.splice(at === -1 ? all.length : at, at === -1 ? 0 : 1, merged.line);
    notes.push(...merged.notes);
  }
  return { lines: all, notes };
}

const isOf = (line: GoodsLineTyped, { of, id }: MoreOf): boolean =>
  line.of === 'leather'
    ? of === 'leather' && line.leatherId === id
    : of === 'hardware' && line.hardwareId === id;
