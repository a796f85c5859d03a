import { Router } from 'express';
import { adjustStock, listReservations, listStockMovements } from '@hidewright/contract';
import type { Context } from '../../context.ts';
import { adjustToCount } from '../../flows/adjust-stock.ts';
import { readCursor, toPage } from '../../http/paging.ts';
import { serve } from '../../http/serve.ts';
import { readMovements, readReservations } from './read-ledger.ts';

export function stockRoutes(context: Context): Router {
  const router = Router();

  serve(router, context, listStockMovements, async ({ em }, { query }) => {
    const { cursor, limit, ...filters } = query;
    const rows = await readMovements(em, {
      ...filters,
      below: readCursor(cursor),
      limit: limit + 1,
    });
    return toPage(rows, limit, (row) => row.id);
  });

  serve(router, context, listReservations, async ({ em }, { query }) => {
    const { cursor, limit, ...filters } = query;
    const rows = await readReservations(em, {
      ...filters,
      below: readCursor(cursor),
      limit: limit + 1,
    });
    return toPage(rows, limit, (row) => row.id);
  });

  serve(router, context, adjustStock, async (work, { body }) => adjustToCount(work, body));

  return router;
}
