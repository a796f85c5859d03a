import { Router } from 'express';
import { checkQuote, checkRuns, draftShort } from '@hidewright/contract';
import type { Context } from '../../context.ts';
import { checkPlanned } from '../../flows/check/checked-runs.ts';
import { layAskedPatterns, planAskedRuns } from '../../flows/check/runs-asked.ts';
import { checkQuotedRun } from '../../flows/check-run.ts';
import { checkAskedRuns } from '../../flows/check-runs.ts';
import { draftWhatIsShort } from '../../flows/draft-what-is-short.ts';
import type { LaidPattern } from '../../flows/lay-pattern.ts';
import { serve } from '../../http/serve.ts';
import { readPurchaseOrderList } from '../purchase-orders/read-purchase-orders.ts';

export function checkRoutes(context: Context): Router {
  const router = Router();

  serve(router, context, checkQuote, (work, { params, query }) =>
    checkQuotedRun(work, {
      quoteId: params.id,
      quantity: query.quantity,
      option: query.option,
      by: query.by,
    }),
  );

  serve(
    router,
    context,
    checkRuns,
    (work, { body }, laid: (LaidPattern | null)[]) => checkAskedRuns(work, body.runs, laid),
    ({ body }) => layAskedPatterns(context, body.runs),
  );

  serve(
    router,
    context,
    draftShort,
    async (work, { body }, laid: (LaidPattern | null)[]) => {
      const checked = await checkPlanned(work, await planAskedRuns(work, body.runs, laid));
      const { orders, notes } = await draftWhatIsShort(work, checked);
      const ids = orders.map(({ id }) => id);
      return { orders: await readPurchaseOrderList(work, { id: ids }, 100), notes };
    },
    ({ body }) => layAskedPatterns(context, body.runs),
  );

  return router;
}
