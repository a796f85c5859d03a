import { Router } from 'express';
import { Decimal } from 'decimal.js';
import {
  addLeather,
  changeLeather,
  listLeathers,
  readLeather,
  type Leather as LeatherReply,
} from '@hidewright/contract';
import type { Context } from '../../context.ts';
import { assignDefined } from '../../db/assign-defined.ts';
import { requireVersion } from '../../http/conditions.ts';
import { requireFreeName } from '../../http/free-name.ts';
import { priceText } from '../../http/decimal-text.ts';
import { readCursor, toPage } from '../../http/paging.ts';
import { invalid, notFound } from '../../http/problem.ts';
import { serve } from '../../http/serve.ts';
import type { Work } from '../../work.ts';
import { logDeed } from '../activity/activity-log.ts';
import { Supplier } from '../suppliers/supplier.entity.ts';
import { Leather } from './leather.entity.ts';
import { readLeatherStock, type LeatherStock } from './read-leather-stock.ts';

export function leatherRoutes(context: Context): Router {
  const router = Router();

  serve(router, context, listLeathers, async ({ em }, { query }) => {
    const below = readCursor(query.cursor);
    const rows = await em.find(
      Leather,
      {
        ...(below === undefined ? {} : { id: { $lt: below } }),
        ...(query.q === undefined ? {} : { name: { $like: `%${query.q}%` } }),
      },
      { orderBy: { id: 'desc' }, limit: query.limit + 1 },
    );
    const { items, next } = toPage(rows, query.limit, (row) => row.id);
    const stock = await readLeatherStock(em, items);
    return { items: items.map((leather) => toReply(leather, stock)), next };
  });

  serve(router, context, readLeather, async (work, { params }) =>
    reply(work, await find(work, params.id)),
  );

  serve(router, context, addLeather, async (work, { body }) => {
    requireWeights(body.weightLowOz, body.weightHighOz);
    await requireFreeName(work.em, Leather, body.name);
    await requireSupplier(work, body.supplierId);
    const leather = work.em.create(Leather, {
      ...body,
      pricePerFt2: new Decimal(body.pricePerFt2),
      ...weights(body),
      wholeAreaMm2: decimalOrNull(body.wholeAreaMm2),
      wholeUsablePercent: new Decimal(body.wholeUsablePercent),
      reorderAtMm2: decimalOrNull(body.reorderAtMm2),
    });
    await work.em.flush();
    await logDeed(work, {
      action: `added leather ${leather.name}`,
      subjectKind: 'leather',
      subjectId: leather.id,
    });
    return reply(work, leather);
  });

  serve(router, context, changeLeather, async (work, { params, body, ifMatch }) => {
    const leather = await find(work, params.id);
    await requireVersion(
      work.em,
      { kind: 'leather', id: leather.id, version: leather.version },
      ifMatch,
    );
    if (body.name !== undefined) await requireFreeName(work.em, Leather, body.name, leather.id);
    await requireSupplier(work, body.supplierId);
    const { pricePerFt2, weightLowOz, weightHighOz, ...others } = body;
    const { wholeAreaMm2, wholeUsablePercent, reorderAtMm2, ...plain } = others;
    assignDefined(leather, plain);
    if (reorderAtMm2 !== undefined) leather.reorderAtMm2 = decimalOrNull(reorderAtMm2);
    if (pricePerFt2 !== undefined) leather.pricePerFt2 = new Decimal(pricePerFt2);
    if (wholeAreaMm2 !== undefined) leather.wholeAreaMm2 = decimalOrNull(wholeAreaMm2);
    if (wholeUsablePercent !== undefined)
      leather.wholeUsablePercent = new Decimal(wholeUsablePercent);
    if (weightLowOz !== undefined) leather.weightLowOz = decimalOrNull(weightLowOz);
    if (weightHighOz !== undefined) leather.weightHighOz = decimalOrNull(weightHighOz);
    requireWeights(
      leather.weightLowOz?.toString() ?? null,
      leather.weightHighOz?.toString() ?? null,
    );
    await work.em.flush();
    await logDeed(work, {
      action: `changed leather ${leather.name}`,
      subjectKind: 'leather',
      subjectId: leather.id,
      detail: { changed: Object.keys(body) },
    });
    return reply(work, leather);
  });

  return router;
}

async function find(work: Work, id: number): Promise<Leather> {
  const leather = await work.em.findOne(Leather, id);
  if (leather === null) throw notFound('leather');
  return leather;
}

const decimalOrNull = (text: string | null) => (text === null ? null : new Decimal(text));

const weights = (body: { weightLowOz: string | null; weightHighOz: string | null }) => ({
  weightLowOz: decimalOrNull(body.weightLowOz),
  weightHighOz: decimalOrNull(body.weightHighOz),
});

function requireWeights(low: string | null, high: string | null): void {
  if (low !== null && Number(low) === 0) {
    throw invalid([
      { field: 'weightLowOz', message: 'Enter a weight above 0 oz, or leave it empty.' },
    ]);
  }
  if (high !== null && (low === null || new Decimal(high).lessThan(low))) {
    throw invalid([
      { field: 'weightHighOz', message: 'The higher weight must not be below the lower one.' },
    ]);
  }
}

async function requireSupplier(work: Work, id: number | null | undefined): Promise<void> {
  if (id === null || id === undefined || (await work.em.findOne(Supplier, id)) !== null) return;
  throw invalid([{ field: 'supplierId', message: 'Choose a supplier from the list.' }]);
}

async function reply(work: Work, leather: Leather): Promise<LeatherReply> {
  return toReply(leather, await readLeatherStock(work.em, [leather]));
}

function toReply(leather: Leather, stock: LeatherStock): LeatherReply {
  return {
    id: leather.id,
    name: leather.name,
    tannage: leather.tannage,
    colour: leather.colour,
    finish: leather.finish,
    weightLowOz: leather.weightLowOz?.toString() ?? null,
    weightHighOz: leather.weightHighOz?.toString() ?? null,
    pricePerFt2: priceText(leather.pricePerFt2),
    supplierId: leather.supplierId,
    wholeForm: leather.wholeForm,
    wholeAreaMm2: leather.wholeAreaMm2?.toString() ?? null,
    wholeUsablePercent: leather.wholeUsablePercent.toString(),
    reorderAtMm2: leather.reorderAtMm2?.toString() ?? null,
    supplierName: stock.supplierNames.get(leather.supplierId ?? 0) ?? null,
    active: leather.active,
    ...stock.areasOf(leather.id),
    version: leather.version,
  };
}
