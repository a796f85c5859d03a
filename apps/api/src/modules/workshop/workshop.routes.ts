import { Router } from 'express';
import { Decimal } from 'decimal.js';
import {
  changeWorkshop,
  readWorkshop,
  type BodyOf,
  type Workshop as WorkshopReply,
} from '@hidewright/contract';
import { currencies } from '@hidewright/domain';
import type { Context } from '../../context.ts';
import { assignDefined } from '../../db/assign-defined.ts';
import { requireVersion } from '../../http/conditions.ts';
import { moneyText, priceText } from '../../http/decimal-text.ts';
import { invalid } from '../../http/problem.ts';
import { serve } from '../../http/serve.ts';
import { logDeed } from '../activity/activity-log.ts';
import type { Work } from '../../work.ts';
import { Workshop } from './workshop.entity.ts';

export function workshopRoutes(context: Context): Router {
  const router = Router();
  const { available: mailAvailable } = context.mailer;

  serve(router, context, readWorkshop, async ({ em }) =>
    toReply(await em.findOneOrFail(Workshop, 1), mailAvailable),
  );

  serve(router, context, changeWorkshop, async (work, { body, ifMatch }) => {
    const workshop = await work.em.findOneOrFail(Workshop, 1);
    await requireVersion(work.em, { kind: 'workshop', id: 1, version: workshop.version }, ifMatch);
    requireKnownCurrency(body.currency);
    await requireSameCurrency(work, workshop, body.currency);
    await beginValuing(work, workshop, body.stockValue);
    assignDefined(workshop, decimalsOf(body));
    await work.em.flush();
    await logDeed(work, {
      action: 'changed the shop’s starting values',
      subjectKind: 'workshop',
      subjectId: 1,
      detail: { changed: Object.keys(body) },
    });
    return toReply(workshop, mailAvailable);
  });

  return router;
}

const decimalFields = [
  'targetPerHour',
  'wagePerHour',
  'packingPerOrder',
  'rejectPercent',
  'confidencePercent',
  'priceStep',
  'benchHoursPerDay',
  'spacingMm',
  'trimMm',
  'depositPercent',
  'minimumWagePerHour',
  'restPercent',
  'overheadPerHour',
  'packingPerPiece',
  'cardFeePercent',
  'cardFeeEach',
  'setUpCharge',
  'minimumOrder',
  'areaTolerancePercent',
  'servicePercent',
  'orderCost',
  'holdingPercent',
] as const;
type DecimalField = (typeof decimalFields)[number];

type Typed = BodyOf<typeof changeWorkshop>;

function decimalsOf(body: Typed) {
  const decimals: Partial<Record<DecimalField, Decimal>> = {};
  for (const field of decimalFields) {
    const text = body[field];
    if (text !== undefined) decimals[field] = new Decimal(text);
  }
  return { ...(body as Omit<Typed, DecimalField>), ...decimals };
}

/** A new way of valuing holds for what moves from now on. */
async function beginValuing(
  { em }: Work,
  workshop: Workshop,
  chosen: Workshop['stockValue'] | undefined,
): Promise<void> {
  if (chosen === undefined || chosen === workshop.stockValue) return;
  const [row] = await em.execute<[{ last: number }]>(
    'SELECT COALESCE(MAX(id), 0) AS last FROM stock_movement',
  );
  workshop.stockValueAfter = row.last;
}

function requireKnownCurrency(code: string | undefined): void {
  if (code !== undefined && !currencies.some((currency) => currency.code === code)) {
    throw invalid([{ field: 'currency', message: 'Choose a currency from the list.' }]);
  }
}

/** Amounts on papers say no currency of their own: another one would give them another worth. */
async function requireSameCurrency(
  { em }: Work,
  { currency }: Workshop,
  asked: string | undefined,
): Promise<void> {
  if (asked === undefined || asked === currency) return;
  const [papers] = await em.execute<[{ any: number }]>(
    `SELECT EXISTS (SELECT 1 FROM quote) OR EXISTS (SELECT 1 FROM purchase_order)
      OR EXISTS (SELECT 1 FROM stock_movement WHERE value <> 0) AS any`,
  );
  if (papers.any === 0) return;
  const message = `Quotes, orders or stock are kept in ${currency}, and would mix with ${asked}. Keep ${currency}, or open a new shop in ${asked}.`;
  throw invalid([{ field: 'currency', message }]);
}

function toReply(workshop: Workshop, mailAvailable: boolean): WorkshopReply {
  return {
    name: workshop.name,
    currency: workshop.currency,
    areaUnit: workshop.areaUnit,
    areaShown: workshop.areaShown,
    lengthUnit: workshop.lengthUnit,
    timeZone: workshop.timeZone,
    targetPerHour: moneyText(workshop.targetPerHour),
    wagePerHour: moneyText(workshop.wagePerHour),
    deskMinutesPerOrder: workshop.deskMinutesPerOrder,
    packingPerOrder: moneyText(workshop.packingPerOrder),
    rejectPercent: workshop.rejectPercent.toString(),
    confidencePercent: workshop.confidencePercent.toString(),
    priceStep: moneyText(workshop.priceStep),
    benchHoursPerDay: workshop.benchHoursPerDay.toString(),
    spacingMm: workshop.spacingMm.toString(),
    trimMm: workshop.trimMm.toString(),
    depositPercent: workshop.depositPercent.toString(),
    quoteValidDays: workshop.quoteValidDays,
    minimumWagePerHour: moneyText(workshop.minimumWagePerHour),
    restPercent: workshop.restPercent.toString(),
    overheadPerHour: moneyText(workshop.overheadPerHour),
    packingPerPiece: priceText(workshop.packingPerPiece),
    cardFeePercent: workshop.cardFeePercent.toString(),
    cardFeeEach: moneyText(workshop.cardFeeEach),
    setUpCharge: moneyText(workshop.setUpCharge),
    minimumOrder: moneyText(workshop.minimumOrder),
    priceRule: workshop.priceRule,
    stockValue: workshop.stockValue,
    paymentTermDays: workshop.paymentTermDays,
    address: workshop.address,
    taxNumber: workshop.taxNumber,
    areaTolerancePercent: workshop.areaTolerancePercent.toString(),
    servicePercent: workshop.servicePercent.toString(),
    orderCost: moneyText(workshop.orderCost),
    holdingPercent: workshop.holdingPercent.toString(),
    mode: workshop.mode,
    mailAvailable,
    version: workshop.version,
  };
}
