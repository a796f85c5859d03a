import { Router } from 'express';
import {
  addPurchaseOrder,
  cancelPurchaseOrder as cancelEndpoint,
  changeAwaitedDay,
  changePurchaseOrder,
  closePurchaseLine,
  listPurchaseOrders,
  purchaseOrderPaper,
  readPurchaseOrder,
  reopenPurchaseOrder,
  sendPurchaseOrder as sendEndpoint,
  type QueryOf,
} from '@hidewright/contract';
import type { FilterQuery } from '@mikro-orm/core';
import type { Context } from '../../context.ts';
import {
  putPurchaseOrderOnPaper,
  type PurchaseOrderOnPaper,
} from '../../flows/put-purchase-order-on-paper.ts';
import { sendPurchaseOrder } from '../../flows/send-purchase-order.ts';
import { putLotsBack } from '../../flows/services/put-lots-back.ts';
import { requireVersion } from '../../http/conditions.ts';
import { readCursor, toPage } from '../../http/paging.ts';
import { serve, serveFile } from '../../http/serve.ts';
import { awaitLineOn } from './await-line-on.ts';
import { closeLine } from './close-line.ts';
import {
  cancelPurchaseOrder,
  changeDraft,
  draftPurchaseOrder,
  findPurchaseOrder,
} from './draft-purchase-order.ts';
import { paperOf } from './purchase-order-paper.ts';
import type { PurchaseOrder } from './purchase-order.entity.ts';
import { reopenLines } from './reopen-lines.ts';
import { readOnePurchaseOrder, readPurchaseOrderList } from './read-purchase-orders.ts';

export function purchaseOrderRoutes(context: Context): Router {
  const router = Router();

  serve(router, context, listPurchaseOrders, async (work, { query }) => {
    const rows = await readPurchaseOrderList(work, filtersOf(query), query.limit + 1);
    return toPage(rows, query.limit, (row) => row.id);
  });

  serve(router, context, readPurchaseOrder, async (work, { params }) =>
    readOnePurchaseOrder(work, params.id),
  );

  serve(router, context, addPurchaseOrder, async (work, { body }) => {
    const order = await draftPurchaseOrder(work, body);
    return readOnePurchaseOrder(work, order.id);
  });

  serve(router, context, changePurchaseOrder, async (work, { params, body, ifMatch }) => {
    const order = await findPurchaseOrder(work, params.id);
    await requireVersion(
      work.em,
      { kind: 'purchase order', id: order.id, version: order.version },
      ifMatch,
    );
    await changeDraft(work, order, body);
    return readOnePurchaseOrder(work, order.id);
  });

  serve(router, context, changeAwaitedDay, async (work, { params, body, ifMatch }) => {
    const order = await findPurchaseOrder(work, params.id);
    const { id, version } = order;
    await requireVersion(work.em, { kind: 'purchase order', id, version }, ifMatch);
    await awaitLineOn(work, order, { lineId: params.lineId, expectedOn: body.expectedOn });
    return readOnePurchaseOrder(work, id);
  });

  serve(router, context, closePurchaseLine, async (work, { params, body }) => {
    const order = await findPurchaseOrder(work, params.id);
    await closeLine(work, order, { lineId: params.lineId, reason: body.reason });
    await putLotsBack(work, order, params.lineId);
    return readOnePurchaseOrder(work, order.id);
  });

  serve(router, context, reopenPurchaseOrder, async (work, { params, body }) => {
    const order = await findPurchaseOrder(work, params.id);
    await reopenLines(work, order, body);
    return readOnePurchaseOrder(work, order.id);
  });

  serve(
    router,
    context,
    sendEndpoint,
    async (work, { params, body }, drawn: PurchaseOrderOnPaper) => {
      const asked = { id: params.id, by: body.by, mailIsSet: context.mailer.available };
      await sendPurchaseOrder(work, asked, drawn);
      return readOnePurchaseOrder(work, params.id);
    },
    ({ params }, actor) => putPurchaseOrderOnPaper(context, actor, params.id),
  );

  serveFile(router, context, purchaseOrderPaper, async (work, { params }) => {
    const order = await findPurchaseOrder(work, params.id);
    const bytes =
      order.paperHash === null
        ? await context.papers.purchaseOrder(await paperOf(work, order))
        : await context.files.read(order.paperHash);
    return { name: `${order.number}.pdf`, type: 'application/pdf', bytes };
  });

  serve(router, context, cancelEndpoint, async (work, { params, body }) => {
    const order = await findPurchaseOrder(work, params.id);
    await cancelPurchaseOrder(work, order, body.reason);
    await putLotsBack(work, order);
    return readOnePurchaseOrder(work, params.id);
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
