import type { CheckAnswer, RunCheck } from '@hidewright/contract';
import { addDays, addWorkdays, checkRun, type Answer, type CheckInput } from '@hidewright/domain';
import { Decimal } from 'decimal.js';
import type { EntityManager } from '@mikro-orm/sqlite';
import { invalid, notFound } from '../http/problem.ts';
import { Leather } from '../modules/leathers/leather.entity.ts';
import { Quote } from '../modules/quotes/quote.entity.ts';
import { QuoteBreak } from '../modules/quotes/quote-break.entity.ts';
import { sayDay } from '../modules/quotes/say-day.ts';
import { sayArea } from '../modules/stock/say-area.ts';
import { Workshop } from '../modules/workshop/workshop.entity.ts';
import type { Work } from '../work.ts';
import { buyMore, hardwareForCheck } from './check/hardware-for-check.ts';
import { hoursForCheck } from './check/hours-for-check.ts';
import { freeLotsOf, type RackLot } from './check/leather-for-check.ts';
import { toolingForCheck } from './check/tooling-for-check.ts';
import { planRun, type RunPlan } from './run-plan.ts';

interface Asked {
  quoteId: number;
  /** What was agreed, or else the least that is offered. */
  quantity: number | undefined;
  /** What was agreed, or else the piece as it is. */
  option?: string | undefined;
  /** The day in hands, or else two working weeks from today. */
  by: string | undefined;
}

/**
 * Can we make it? For a quote in any state.
 * @throws {Problem} 404, 422 for a day that is over or too far off
 */
export async function checkQuotedRun(work: Work, asked: Asked): Promise<RunCheck> {
  const quote = await work.em.findOne(Quote, asked.quoteId);
  if (quote === null) throw notFound('quote');
  const by = asked.by ?? usualDay(work, quote);
  requireReachable(work, by, 'by');
  const quantity = asked.quantity ?? (await usualQuantity(work.em, quote));
  const option = asked.option ?? quote.agreedOption;
  return checkPlan(work, await planRun(work.em, quote, quantity, option), {
    by,
    customerId: quote.customerId,
  });
}

/** A day that can be promised: not over, and within two years. @throws {Problem} 422 */
export function requireReachable({ today }: Work, day: string, field: string): void {
  if (day < today)
    throw invalid([{ field, message: 'That day is over. Choose today or a day to come.' }]);
  if (day > addDays(today, 731))
    throw invalid([{ field, message: 'That is more than two years off. Choose a nearer day.' }]);
}

function usualDay({ today }: Work, quote: Quote): string {
  return quote.inHandsOn !== null && quote.inHandsOn >= today
    ? quote.inHandsOn
    : addWorkdays(today, 10);
}

async function usualQuantity(em: EntityManager, quote: Quote): Promise<number> {
  if (quote.agreedQuantity !== null) return quote.agreedQuantity;
  const least = await em.findOneOrFail(
    QuoteBreak,
    { quoteId: quote.id },
    { orderBy: { quantity: 'asc' } },
  );
  return least.quantity;
}

/** Leather, hardware, tooling and bench hours of a planned run against what is free now. */
export async function checkPlan(
  work: Work,
  plan: RunPlan,
  { by, customerId }: { by: string; customerId: number },
): Promise<RunCheck> {
  const { em } = work;
  const leather = await em.findOneOrFail(Leather, plan.leatherId);
  const lots = await freeLotsOf(em, plan.leatherId);
  const hardware = await hardwareForCheck(em, plan.hardware);
  const tooling = await toolingForCheck(em, { ...plan, customerId, pieces: plan.cutCount });
  const hours = await hoursForCheck(work, plan.plannedMinutes, by);
  const input: CheckInput = {
    leather: { name: leather.name, neededAreaMm2: plan.leatherAreaMm2, lots },
    hardware,
    tooling,
    hours: { day: sayDay(by), neededMinutes: hours.neededMinutes, freeMinutes: hours.freeMinutes },
  };
  const { ok, answers } = checkRun(input);
  const remedies = [
    'Buy more, or receive it if it is here.',
    ...hardware.map(buyMore),
    ...tooling.map(({ remedy }) => remedy),
    hours.remedy,
  ];
  const sayLeather = await leatherSayer(em);
  return {
    ...{
      quantity: plan.quantity,
      by,
      cutCount: plan.cutCount,
      containers: plan.containers,
      yes: ok,
    },
    answers: answers.map((answer, at) => toReply(answer, sayLeather(answer), remedies[at] ?? '')),
    lots: answers.flatMap((answer) => takesFrom(answer, lots)),
    earliestDay: hours.earliest,
  };
}

/** The leather's sentence in the shop's own unit; the others say theirs themselves. */
async function leatherSayer(em: EntityManager): Promise<(answer: Answer) => string> {
  const { areaUnit } = await em.findOneOrFail(Workshop, 1);
  const say = (areaMm2: string) => sayArea(new Decimal(areaMm2), areaUnit);
  return ({ about, ok, name, needed, free, short, sentence, lots = [] }) => {
    if (about !== 'leather') return sentence;
    if (!ok) return `${name}: ${say(needed)} needed, ${say(free)} free, ${say(short)} short.`;
    return `${name}: take ${lots.map((lot) => `${say(lot.takeAreaMm2)} from ${lot.tag}`).join(', ')}.`;
  };
}

function toReply(answer: Answer, said: string, remedy: string): CheckAnswer {
  const { about, name, unit, needed, free, short, ok } = answer;
  return {
    about,
    name,
    unit,
    needed,
    free,
    short,
    enough: ok,
    sentence: ok ? said : `${said} ${remedy}`.trim(),
  };
}

function takesFrom(answer: Answer, rack: readonly RackLot[]): RunCheck['lots'] {
  return (answer.lots ?? []).flatMap(({ lotId, tag, takeAreaMm2 }) => {
    const lot = rack.find((each) => each.lotId === lotId);
    return lot === undefined
      ? []
      : [{ lotId, tag, place: lot.place, freeAreaMm2: lot.freeAreaMm2, takesAreaMm2: takeAreaMm2 }];
  });
}
