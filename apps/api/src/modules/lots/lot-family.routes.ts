import { Router } from 'express';
import {
  readLastTimeOfOrder,
  readLastTimeOfQuote,
  readLotFamily,
  readOrderLeather,
} from '@hidewright/contract';
import type { Context } from '../../context.ts';
import { serve } from '../../http/serve.ts';
import { Job } from '../jobs/job.entity.ts';
import { findOrder } from '../orders/find-order.ts';
import { findQuote } from '../quotes/find-quote.ts';
import { readLastTime } from './last-time.ts';
import { readCutFrom, readFamily } from './lot-family.ts';

/** From the side to the customer, and back. */
export function lotFamilyRoutes(context: Context): Router {
  const router = Router();

  serve(router, context, readLotFamily, ({ em }, { params }) => readFamily(em, params.id));

  serve(router, context, readOrderLeather, async ({ em }, { params }) => {
    const { id } = await findOrder(em, params.id);
    return { lots: await readCutFrom(em, id) };
  });

  serve(router, context, readLastTimeOfOrder, async ({ em }, { params }) => {
    const { id: orderId, customerId } = await findOrder(em, params.id);
    const { patternVersionId } = await em.findOneOrFail(Job, { orderId });
    const pattern = { versionId: patternVersionId };
    return { lastTime: await readLastTime(em, { customerId, pattern, before: { orderId } }) };
  });

  serve(router, context, readLastTimeOfQuote, async ({ em }, { params }) => {
    const { customerId, patternVersionId } = await findQuote({ em }, params.id);
    const pattern = { versionId: patternVersionId };
    return {
      lastTime: await readLastTime(em, { customerId, pattern, before: { quoteId: params.id } }),
    };
  });

  return router;
}
