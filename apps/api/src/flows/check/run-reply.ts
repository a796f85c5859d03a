import type { CheckAnswer, CheckLot, RunCheck } from '@hidewright/contract';
import {
  hardwareWords,
  hoursWords,
  leatherWords,
  lotWords,
  toolWords,
  type HoursFacts,
  type ItemFacts,
  type LeatherFacts,
  type LotTaken,
  type Say,
  type Standing,
  type ToolFacts,
} from '@hidewright/domain';
import { Decimal } from 'decimal.js';
import type { EntityManager } from '@mikro-orm/sqlite';
import { unscaled } from '../../db/columns/scaled-decimal.ts';
import { sayDay } from '../../say-day.ts';
import { sayRackArea } from '../../modules/stock/say-area.ts';
import { Workshop } from '../../modules/workshop/workshop.entity.ts';
import type { CheckedRun } from './checked-runs.ts';
import { patternRemarks } from './pattern-remarks.ts';

/** How this shop says areas and days. */
export async function sayFor(em: EntityManager): Promise<Say> {
  const habit = await em.findOneOrFail(Workshop, 1);
  return { area: (areaMm2) => sayRackArea(new Decimal(areaMm2.toString()), habit), day: sayDay };
}

/** Every question answered, with what to take or what mends it. */
export function runReply(
  { planned, facts, press, misfits, finished }: CheckedRun,
  say: Say,
): RunCheck {
  const { plan, by } = planned;
  const answers = [
    leatherAnswer(facts.leather, say),
    ...facts.items.map((item) => itemAnswer(item, say)),
    ...facts.tools.map(toolAnswer),
    ...(press === null ? [] : [press]),
    hoursAnswer(facts.hours, say),
  ];
  return {
    quantity: plan.quantity,
    by,
    startBy: facts.startBy,
    cutCount: plan.cutCount,
    containers: plan.containers,
    yes: answers.every(({ enough }) => enough),
    answers,
    lots: facts.leather.takes.map(toLot),
    patternId: plan.patternId,
    remarks: patternRemarks({ planned, facts, misfits }),
    notes: [...finished, ...notesOn(planned)],
    earliestDay: facts.earliest,
  };
}

function notesOn({ plan, customerId, definition }: CheckedRun['planned']): string[] {
  const plate =
    plan.needsPlate && customerId === null
      ? ['A stamp plate is cut for each design: allow for its days.']
      : [];
  const supplies = (definition.supplies ?? []).map(({ name }) => name);
  const unseen =
    supplies.length === 0 ? [] : [`Not counted here, look yourself: ${supplies.join(', ')}.`];
  return [...plate, ...unseen];
}

const area = (thousandths: number): string => unscaled(thousandths, 3).toFixed();

const figures = (
  { needed, now, free, short, enoughOn, buy, drafted }: Standing,
  text: (quantity: number) => string,
) => ({
  needed: text(needed),
  freeNow: text(now),
  free: text(free),
  short: text(short),
  enough: short === 0,
  enoughOn,
  toBuy: buy > drafted,
});

function leatherAnswer(facts: LeatherFacts, say: Say): CheckAnswer {
  const { name } = facts.leather;
  return {
    ...figures(facts.standing, area),
    about: 'leather',
    name,
    hardwareId: null,
    unit: 'mm2',
    enough: facts.piecesShort === 0,
    sentence: leatherWords(facts, say),
  };
}

function itemAnswer(facts: ItemFacts, say: Say): CheckAnswer {
  const { name, kind, hardwareId } = facts.item;
  const sentence = hardwareWords(facts, say);
  return { ...figures(facts, String), about: kind, name, hardwareId, unit: 'piece', sentence };
}

function toolAnswer(facts: ToolFacts): CheckAnswer {
  const { need, tool, strikesNeeded, strikesLeft, ok } = facts;
  const left = tool === null ? 0 : strikesLeft;
  return {
    about: 'tooling',
    name: tool?.name ?? need.word,
    hardwareId: need.setsHardwareId ?? null,
    unit: 'strike',
    needed: String(strikesNeeded),
    freeNow: String(left),
    free: String(left),
    short: String(Math.max(0, strikesNeeded - left)),
    enough: ok,
    enoughOn: null,
    toBuy: false,
    sentence: toolWords(facts),
  };
}

function hoursAnswer(facts: HoursFacts, say: Say): CheckAnswer {
  const text = (hundredths: number) => unscaled(hundredths, 2).toString();
  return {
    about: 'hours',
    name: 'Bench hours',
    hardwareId: null,
    unit: 'minute',
    needed: text(facts.needed),
    freeNow: text(facts.free),
    free: text(facts.free),
    short: text(Math.max(0, facts.needed - facts.free)),
    enough: facts.ok,
    enoughOn: facts.earliest,
    toBuy: false,
    sentence: hoursWords(facts, say),
  };
}

function toLot(taken: LotTaken): CheckLot {
  const { lot, pieces, by } = taken;
  return {
    lotId: lot.lotId,
    tag: lot.tag,
    place: lot.place,
    shade: lot.shade,
    freeAreaMm2: area(lot.freeArea),
    takesAreaMm2: area(taken.area),
    pieces,
    by,
    sentence: lotWords(taken),
  };
}
