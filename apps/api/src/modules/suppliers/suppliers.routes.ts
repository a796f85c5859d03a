import { Router } from 'express';
import {
  addSupplier,
  changeSupplier,
  listSuppliers,
  readSupplier,
  type Supplier as SupplierReply,
} from '@hidewright/contract';
import type { Context } from '../../context.ts';
import { assignDefined } from '../../db/assign-defined.ts';
import { requireVersion } from '../../http/conditions.ts';
import { requireFreeName } from '../../http/free-name.ts';
import { readCursor, toPage } from '../../http/paging.ts';
import { notFound } from '../../http/problem.ts';
import { serve } from '../../http/serve.ts';
import type { Work } from '../../work.ts';
import { logDeed } from '../activity/activity-log.ts';
import { Supplier } from './supplier.entity.ts';

export function supplierRoutes(context: Context): Router {
  const router = Router();

  serve(router, context, listSuppliers, async ({ em }, { query }) => {
    const below = readCursor(query.cursor);
    const rows = await em.find(
      Supplier,
      {
        ...(below === undefined ? {} : { id: { $lt: below } }),
        ...(query.q === undefined ? {} : { name: { $like: `%${query.q}%` } }),
      },
      { orderBy: { id: 'desc' }, limit: query.limit + 1 },
    );
    const { items, next } = toPage(rows, query.limit, (row) => row.id);
    return { items: items.map(toReply), next };
  });

  serve(router, context, readSupplier, async (work, { params }) =>
    toReply(await find(work, params.id)),
  );

  serve(router, context, addSupplier, async (work, { body }) => {
    await requireFreeName(work.em, Supplier, body.name);
    const supplier = work.em.create(Supplier, body);
    await work.em.flush();
    await log(work, supplier, 'added');
    return toReply(supplier);
  });

  serve(router, context, changeSupplier, async (work, { params, body, ifMatch }) => {
    const supplier = await find(work, params.id);
    await requireVersion(
      work.em,
      { kind: 'supplier', id: supplier.id, version: supplier.version },
      ifMatch,
    );
    if (body.name !== undefined) await requireFreeName(work.em, Supplier, body.name, supplier.id);
    assignDefined(supplier, body);
    await work.em.flush();
    await log(work, supplier, 'changed', { changed: Object.keys(body) });
    return toReply(supplier);
  });

  return router;
}

async function find(work: Work, id: number): Promise<Supplier> {
  const supplier = await work.em.findOne(Supplier, id);
  if (supplier === null) throw notFound('supplier');
  return supplier;
}

function log(
  work: Work,
  supplier: Supplier,
  verb: 'added' | 'changed',
  detail: Record<string, unknown> = {},
) {
  return logDeed(work, {
    action: `${verb} supplier ${supplier.name}`,
    subjectKind: 'supplier',
    subjectId: supplier.id,
    detail,
  });
}

function toReply(supplier: Supplier): SupplierReply {
  return {
    id: supplier.id,
    name: supplier.name,
    email: supplier.email,
    phone: supplier.phone,
    leadDays: supplier.leadDays,
    note: supplier.note,
    active: supplier.active,
    version: supplier.version,
  };
}
