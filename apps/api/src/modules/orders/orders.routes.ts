import { Router } from 'express';
import { listOrders, readOrder, recordArrival, shipOrder, takeOnOrder } from '@hidewright/contract';
import type { Context } from '../../context.ts';
import { noteArrival } from '../../flows/note-arrival.ts';
import { shipOrder as ship } from '../../flows/ship-order.ts';
import { takeOnOrder as takeOn } from '../../flows/take-on-order.ts';
import { readCursor, toPage } from '../../http/paging.ts';
import { serve } from '../../http/serve.ts';
import { findOrders, readOrderReply } from './orders.repository.ts';

export function orderRoutes(context: Context): Router {
  const router = Router();

  serve(router, context, listOrders, async ({ em }, { query }) => {
    const { limit, q, state, customerId } = query;
    const open = query.open === undefined ? undefined : query.open === 'true';
    const rows = await findOrders(em, {
      below: readCursor(query.cursor),
      limit,
      q,
      state,
      open,
      customerId,
    });
    return toPage(rows, limit, (row) => row.id);
  });

  serve(router, context, readOrder, ({ em }, { params }) => readOrderReply(em, params.id));

  serve(router, context, takeOnOrder, async (work, { body }) => {
    const order = await takeOn(work, body);
    return readOrderReply(work.em, order.id);
  });

  serve(router, context, recordArrival, async (work, { params, body }) => {
    await noteArrival(work, params.id, body.what);
    return readOrderReply(work.em, params.id);
  });

  serve(router, context, shipOrder, async (work, { params, body }) => {
    await ship(work, params.id, body.shippedOn);
    return readOrderReply(work.em, params.id);
  });

  return router;
}
