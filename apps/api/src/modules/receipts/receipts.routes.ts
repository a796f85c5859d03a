import { Router } from 'express';
import {
  answerDelivery as answerEndpoint,
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
import type { Work } from '../../work.ts';
import { answerDelivery } from './answer-delivery.ts';
import { findReceipt } from './find-receipt.ts';
import { readOneReceipt, readReceiptList } from './read-receipts.ts';
import type { Receipt } from './receipt.entity.ts';

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
    const receipt = await receiptAsRead(work, params.id, ifMatch);
    await correctReceipt(work, receipt, body);
    return readOneReceipt(work.em, receipt.id);
  });

  serve(router, context, answerEndpoint, async (work, { params, body, ifMatch }) => {
    const receipt = await receiptAsRead(work, params.id, ifMatch);
    await answerDelivery(work, receipt, body);
    return readOneReceipt(work.em, receipt.id);
  });

  return router;
}

/** @throws {Problem} 404, 412 when somebody changed it meanwhile */
async function receiptAsRead(work: Work, id: number, ifMatch: number): Promise<Receipt> {
  const receipt = await findReceipt(work.em, id);
  const { version } = receipt;
  await requireVersion(work.em, { kind: 'delivery', id, version }, ifMatch);
  return receipt;
}
