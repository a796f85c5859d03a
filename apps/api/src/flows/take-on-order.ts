import type { Awaited, RunCheck } from '@hidewright/contract';
import { Decimal } from 'decimal.js';
import type { EntityManager } from '@mikro-orm/sqlite';
import type { BreakNumbers } from '@hidewright/domain';
import { drawPaperNumber } from '../db/counters.ts';
import { notFound, wrongState } from '../http/problem.ts';
import { logDeed } from '../modules/activity/activity-log.ts';
import { Job } from '../modules/jobs/job.entity.ts';
import { JobStep } from '../modules/jobs/job-step.entity.ts';
import { Order } from '../modules/orders/order.entity.ts';
import { sortAwaits, stateAwaiting } from '../modules/orders/order-states.ts';
import { Quote } from '../modules/quotes/quote.entity.ts';
import { requirePossible } from '../modules/quotes/quote-states.ts';
import { reserveStock } from '../modules/stock/stock-ledger.ts';
import type { Work } from '../work.ts';
import { checkPlanned, type CheckedRun } from './check/checked-runs.ts';
import { runReply, sayFor } from './check/run-reply.ts';
import { planQuoted, requireReachable } from './check/runs-asked.ts';
import { numbersOf, type JobEstimate } from './job-estimate.ts';
import type { RunPlan } from './run-plan.ts';

export interface TakingOn {
  quoteId: number;
  /** The day by which it is packed. */
  promisedOn: string;
  awaits: Awaited[];
  /** Holds what there is, although it is not all. */
  evenIfShort: boolean;
}

/**
 * Takes an agreed quote on: makes the order, its job with its steps, and what is held for it, all or nothing.
 * @throws {Problem} 404; 409 when it is not agreed, was taken on before, or something is short; 422 for a day that
 * cannot be promised
 */
export async function takeOnOrder(work: Work, asked: TakingOn): Promise<Order> {
  const quote = await work.em.findOne(Quote, asked.quoteId);
  if (quote === null) throw notFound('quote');
  await refuseTwice(work.em, quote);
  requirePossible(quote, 'take on');
  requireReachable(work, asked.promisedOn, 'promisedOn');
  const wanted = { quantity: agreedQuantity(quote), by: asked.promisedOn };
  const planned = await planQuoted(work, quote, wanted);
  const { plan } = planned;
  const [checked] = (await checkPlanned(work, [planned])).runs;
  if (checked === undefined) throw new TypeError('One run has one answer');
  if (!asked.evenIfShort) refuseShort(runReply(checked, await sayFor(work.em)), asked.awaits);
  const estimate = toEstimate(plan);
  const order = await makeOrder(work, quote, asked, numbersOf(estimate));
  const job = await makeJob(work, quote, order, plan, estimate);
  await holdStock(work, job, checked);
  return order;
}

async function refuseTwice(em: EntityManager, quote: Quote): Promise<void> {
  const order = await em.findOne(Order, { quoteId: quote.id });
  if (order !== null)
    throw wrongState(`${quote.number} has been taken on as ${order.number}. Open that order.`, [
      'open the order',
    ]);
}

function agreedQuantity(quote: Quote): number {
  if (quote.agreedQuantity === null)
    throw new TypeError('An agreed quote has the quantity that was agreed');
  return quote.agreedQuantity;
}

/** Tooling that is awaited need not be here. */
function refuseShort(check: RunCheck, awaits: readonly Awaited[]): void {
  const short = check.answers.filter(
    ({ about, enough }) => !enough && !(about === 'tooling' && awaits.includes('tooling')),
  );
  if (short.length === 0) return;
  throw wrongState(`Not all is there. ${short.map(({ sentence }) => sentence).join(' ')}`, [
    'buy what is short',
    'promise a later day',
    'take it on although something is short',
  ]);
}

const toEstimate = ({ input, leatherId, leatherAreaMm2, hardware }: RunPlan): JobEstimate => ({
  input,
  leatherId,
  leatherAreaMm2,
  hardware: hardware.map(({ hardwareId, quantity }) => ({ hardwareId, quantity })),
});

async function makeOrder(
  work: Work,
  quote: Quote,
  asked: TakingOn,
  numbers: BreakNumbers,
): Promise<Order> {
  const awaits = sortAwaits(asked.awaits);
  const order = work.em.create(Order, {
    number: await drawPaperNumber(work.em, 'O'),
    quoteId: quote.id,
    customerId: quote.customerId,
    // Whoever makes, packs or pays for it reads which option it is.
    title: quote.agreedOption === null ? quote.title : `${quote.title}, ${quote.agreedOption}`,
    quantity: numbers.quantity,
    priceEach: new Decimal(numbers.priceEach),
    goodsTotal: new Decimal(numbers.goodsTotal),
    toolingCharge: new Decimal(numbers.toolingCharge),
    optionName: quote.agreedOption,
    charges: numbers.charges.map(({ name, amount }) => ({ name, amount })),
    chargesTotal: numbers.charges.reduce((sum, { amount }) => sum.plus(amount), new Decimal(0)),
    total: new Decimal(numbers.total),
    state: stateAwaiting(awaits),
    awaits,
    inHandsOn: quote.inHandsOn,
    promisedOn: asked.promisedOn,
    takenOnAt: work.now.toISOString(),
  });
  await work.em.flush();
  const detail = { quote: quote.number, promisedOn: order.promisedOn, awaits };
  await logDeed(work, {
    action: `took on ${order.number}`,
    subjectKind: 'order',
    subjectId: order.id,
    detail,
  });
  return order;
}

async function makeJob(
  work: Work,
  quote: Quote,
  order: Order,
  plan: RunPlan,
  estimate: JobEstimate,
): Promise<Job> {
  const job = work.em.create(Job, {
    number: await drawPaperNumber(work.em, 'J'),
    orderId: order.id,
    patternVersionId: quote.patternVersionId,
    layoutId: quote.layoutId,
    state: order.awaits.length === 0 ? 'ready' : 'waiting',
    quantity: plan.quantity,
    cutCount: plan.cutCount,
    containers: plan.containers,
    plannedMinutes: plan.plannedMinutes,
    estimate,
  });
  await work.em.flush();
  plan.steps.forEach((step, at) =>
    work.em.create(JobStep, { ...step, jobId: job.id, position: at + 1, minutes: new Decimal(0) }),
  );
  await work.em.flush();
  await logDeed(work, {
    action: `wrote ticket ${job.number}`,
    subjectKind: 'job',
    subjectId: job.id,
    detail: { order: order.number },
  });
  return job;
}

/**
 * Holds what is free now of what is needed and promised to no other job; what comes later is taken when it is here, and
 * until then it counts as promised.
 */
async function holdStock(work: Work, job: Job, { facts }: CheckedRun): Promise<void> {
  for (const { lot, area } of facts.leather.takes) {
    await reserveStock(work, { jobId: job.id, lotId: lot.lotId, quantity: area });
  }
  for (const { item, now } of facts.items) {
    if (now === 0) continue;
    await reserveStock(work, { jobId: job.id, hardwareId: item.hardwareId, quantity: now });
  }
}
