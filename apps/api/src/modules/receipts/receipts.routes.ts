import { Router } from 'express';
import {
  changeReceipt,
  listReceipts,
  readReceipt,
  receiveDelivery as receiveEndpoint,
} from '@hidewright/contract';
import type { Context } from '../../context.ts';
import { correctReceipt } from '../../flows/correct-receipt.ts';
import { describeReceipt, receiveDelivery } from '../../flows/receive-delivery.ts';
import { requireVersion } from '../../http/conditions.ts';
import { readCursor, toPage } from '../../http/paging.ts';
import { serve } from '../../http/serve.ts';
import { findReceipt } from './find-receipt.ts';
import { readOneReceipt, readReceiptList } from './read-receipts.ts';

export function receiptRoutes(context: Context): Router {
  const router = Router();

  serve(router, context, listReceipts, async ({ em }, { query }) => {
    const { cursor, limit, ...filters } = query;
    const rows = await readReceiptList(em, {
      ...filters,
      below: readCursor(cursor),
      limit: limit + 1,
    });
    return toPage(rows, limit, (row) => row.id);
  });

  serve(router, context, readReceipt, async ({ em }, { params }) => readOneReceipt(em, params.id));

  serve(router, context, receiveEndpoint, async (work, { body }) =>
    describeReceipt(work, await receiveDelivery(work, body)),
  );

  serve(router, context, changeReceipt, async (work, { params, body, ifMatch }) => {
    const receipt = await findReceipt(work.em, params.id);
    const { id, version } = receipt;
    await requireVersion(work.em, { kind: 'delivery', id, version }, ifMatch);
    await correctReceipt(work, receipt, body);
    return readOneReceipt(work.em, receipt.id);
  });

  return router;
}
