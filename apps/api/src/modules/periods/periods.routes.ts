import { Router } from 'express';
import {
  listPeriods,
  lockPeriod as lockPeriodEndpoint,
  readSalesSheet as readSalesSheetEndpoint,
  readSalesSheetFile,
  type Period as PeriodReply,
  type SheetTotals,
} from '@hidewright/contract';
import type { Context } from '../../context.ts';
import { lockPeriod } from '../../flows/lock-period.ts';
import { serve, serveFile } from '../../http/serve.ts';
import type { Work } from '../../work.ts';
import { Workshop } from '../workshop/workshop.entity.ts';
import { Period } from './period.entity.ts';
import { readSalesSheet } from './sales-sheet.ts';

export function periodRoutes(context: Context): Router {
  const router = Router();

  serve(router, context, readSalesSheetEndpoint, async ({ em }, { query: { from, to } }) =>
    // One transaction, so that all rows are of the same moment.
    em.transactional(async (moment) => {
      const head = await headOf(moment, from, to);
      const sheet = await readSalesSheet((sql, params) => moment.execute(sql, params), head);
      const overlapping = { fromDay: { $lte: to }, toDay: { $gte: from } };
      const locks = await moment.find(Period, overlapping, { orderBy: { fromDay: 'asc' } });
      return { ...sheet, locks: locks.map(toReply) };
    }),
  );

  serveFile(router, context, readSalesSheetFile, async ({ em }, { query: { from, to } }) => ({
    name: `sales-sheet-${from}-to-${to}.xlsx`,
    type: readSalesSheetFile.file ?? 'application/octet-stream',
    bytes: await context.workers.salesSheet(await headOf(em, from, to)),
  }));

  serve(router, context, listPeriods, async ({ em }) => {
    const periods = await em.find(Period, {}, { orderBy: { fromDay: 'desc' } });
    return { items: periods.map(toReply) };
  });

  serve(router, context, lockPeriodEndpoint, async (work, { body }) =>
    toReply(await lockPeriod(work, body)),
  );

  return router;
}

async function headOf(em: Work['em'], fromDay: string, toDay: string) {
  const workshop = await em.findOneOrFail(Workshop, 1);
  return { fromDay, toDay, workshopName: workshop.name, currency: workshop.currency };
}

const toReply = (period: Period): PeriodReply => ({
  id: period.id,
  fromDay: period.fromDay,
  toDay: period.toDay,
  totals: period.totals as SheetTotals,
  lockedAt: period.lockedAt,
  lockedBy: period.lockedBy,
});
