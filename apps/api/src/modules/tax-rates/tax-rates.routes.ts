import { Router } from 'express';
import { Decimal } from 'decimal.js';
import {
  addTaxRate,
  changeTaxRate,
  listTaxRates,
  type TaxRate as TaxRateReply,
} from '@hidewright/contract';
import type { Context } from '../../context.ts';
import { assignDefined } from '../../db/assign-defined.ts';
import { requireVersion } from '../../http/conditions.ts';
import { notFound } from '../../http/problem.ts';
import { serve } from '../../http/serve.ts';
import { logDeed } from '../activity/activity-log.ts';
import { InvoiceLine } from '../invoices/invoice-line.entity.ts';
import { TaxRate } from './tax-rate.entity.ts';

export function taxRateRoutes(context: Context): Router {
  const router = Router();

  serve(router, context, listTaxRates, async ({ em }) => {
    const rates = await em.find(TaxRate, {}, { orderBy: { name: 'asc' } });
    const [last] = await em.find(
      InvoiceLine,
      {},
      { orderBy: { invoiceId: 'desc', position: 'asc' }, limit: 1 },
    );
    const usual = last === undefined ? null : { taxRateId: last.taxRateId };
    return { items: rates.map(toReply), usual };
  });

  serve(router, context, addTaxRate, async (work, { body }) => {
    const rate = work.em.create(TaxRate, { name: body.name, percent: new Decimal(body.percent) });
    await work.em.flush();
    const action = `entered the tax rate ${rate.name} at ${rate.percent.toString()} %`;
    await logDeed(work, { action, subjectKind: 'tax rate', subjectId: rate.id });
    return toReply(rate);
  });

  serve(router, context, changeTaxRate, async (work, { params, body, ifMatch }) => {
    const rate = await work.em.findOne(TaxRate, params.id);
    if (rate === null) throw notFound('tax rate');
    await requireVersion(
      work.em,
      { kind: 'tax rate', id: rate.id, version: rate.version },
      ifMatch,
    );
    assignDefined(rate, body);
    await work.em.flush();
    const action = `changed the tax rate ${rate.name}`;
    await logDeed(work, {
      action,
      subjectKind: 'tax rate',
      subjectId: rate.id,
      detail: { ...body },
    });
    return toReply(rate);
  });

  return router;
}

const toReply = (rate: TaxRate): TaxRateReply => ({
  id: rate.id,
  name: rate.name,
  percent: rate.percent.toString(),
  active: rate.active,
  version: rate.version,
});
