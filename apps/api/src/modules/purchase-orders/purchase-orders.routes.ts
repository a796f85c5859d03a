import { Router } from 'express';
import {
  addPurchaseOrder,
  cancelPurchaseOrder as cancelEndpoint,
  changePurchaseOrder,
  listPurchaseOrders,
  readPurchaseOrder,
  sendPurchaseOrder as sendEndpoint,
  type QueryOf,
} from '@hidewright/contract';
import type { FilterQuery } from '@mikro-orm/core';
import type { Context } from '../../context.ts';
import { sendPurchaseOrder } from '../../flows/send-purchase-order.ts';
import { requireVersion } from '../../http/conditions.ts';
import { readCursor, toPage } from '../../http/paging.ts';
import { serve } from '../../http/serve.ts';
import {
  cancelPurchaseOrder,
  changeDraft,
  draftPurchaseOrder,
  findPurchaseOrder,
} from './draft-purchase-order.ts';
import type { PurchaseOrder } from './purchase-order.entity.ts';
import { readOnePurchaseOrder, readPurchaseOrderList } from './read-purchase-orders.ts';

export function purchaseOrderRoutes(context: Context): Router {
  const router = Router();

  serve(router, context, listPurchaseOrders, async ({ em }, { query }) => {
    const rows = await readPurchaseOrderList(em, filtersOf(query), query.limit + 1);
    return toPage(rows, query.limit, (row) => row.id);
  });

  serve(router, context, readPurchaseOrder, async ({ em }, { params }) =>
    readOnePurchaseOrder(em, params.id),
  );

  serve(router, context, addPurchaseOrder, async (work, { body }) => {
    const order = await draftPurchaseOrder(work, body);
    return readOnePurchaseOrder(work.em, order.id);
  });

  serve(router, context, changePurchaseOrder, async (work, { params, body, ifMatch }) => {
    const order = await findPurchaseOrder(work, params.id);
    await requireVersion(
      work.em,
      { kind: 'purchase order', id: order.id, version: order.version },
      ifMatch,
    );
    await changeDraft(work, order, body);
    return readOnePurchaseOrder(work.em, order.id);
  });

  serve(router, context, sendEndpoint, async (work, { params, body }) => {
    await sendPurchaseOrder(work, {
      id: params.id,
      by: body.by,
      mailIsSet: context.mailer.available,
    });
    return readOnePurchaseOrder(work.em, params.id);
  });

  serve(router, context, cancelEndpoint, async (work, { params, body }) => {
    await cancelPurchaseOrder(work, await findPurchaseOrder(work, params.id), body.reason);
    return readOnePurchaseOrder(work.em, params.id);
  });

  return router;
}

function filtersOf(query: QueryOf<typeof listPurchaseOrders>): FilterQuery<PurchaseOrder> {
  const below = readCursor(query.cursor);
  return {
    ...(below === undefined ? {} : { id: { $lt: below } }),
    ...(query.q === undefined ? {} : { number: { $like: `%${query.q}%` } }),
    ...(query.supplierId === undefined ? {} : { supplierId: query.supplierId }),
    $and: [
      query.state === undefined ? {} : { state: query.state },
      query.awaited === undefined ? {} : { state: { $in: ['sent', 'part received'] } },
    ],
  };
}
