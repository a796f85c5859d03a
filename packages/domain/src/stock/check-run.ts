import {
  Exact,
  readDecimal,
  readWhole,
  toAtMost,
  type DecimalText,
} from '../numbers/decimal-text.ts';
import { countWords } from '../numbers/count-words.ts';
import { formatFootage } from '../units/footage.ts';
import { chooseLots, type FreeLot, type LotTake } from './choose-lots.ts';

/** What a run needs and what is free for it: stock less what other jobs have reserved. */
export interface CheckInput {
  leather: { name: string; neededAreaMm2: DecimalText; lots: FreeLot[] } | null;
  hardware: { name: string; needed: number; free: number }[];
  /** strikesLeft is null where a tool's life is not counted */
  tooling: { name: string; inShop: boolean; strikesNeeded: number; strikesLeft: number | null }[];
  /** bench minutes until the day; null where no day is asked for */
  hours: { day: string; neededMinutes: DecimalText; freeMinutes: DecimalText } | null;
}

export type AnswerAbout = 'leather' | 'hardware' | 'tooling' | 'hours';

export interface Answer {
  about: AnswerAbout;
  name: string;
  ok: boolean;
  /** what the three figures count */
  unit: 'mm2' | 'piece' | 'strike' | 'minute';
  needed: DecimalText;
  free: DecimalText;
  short: DecimalText;
  /** for the maker: what to take, or what is missing; never a price */
  sentence: string;
  lots?: LotTake[];
}

export interface CheckResult {
  ok: boolean;
  answers: Answer[];
}

/** Can we make it? From what is free now: leather, hardware, tooling, hours. @throws InvalidInput */
export function checkRun(input: CheckInput): CheckResult {
  const answers = [
    ...(input.leather ? [leatherAnswer(input.leather)] : []),
    ...input.hardware.map(hardwareAnswer),
    ...input.tooling.map(toolingAnswer),
    ...(input.hours ? [hoursAnswer(input.hours)] : []),
  ];
  return { ok: answers.every(({ ok }) => ok), answers };
}

function figures(needed: DecimalText, free: DecimalText, places: number) {
  const short = new Exact(needed).minus(free);
  const isShort = short.gt(0);
  return { ok: !isShort, needed, free, short: isShort ? toAtMost(short, places) : '0' };
}

function leatherAnswer({ name, neededAreaMm2, lots }: NonNullable<CheckInput['leather']>): Answer {
  readDecimal(neededAreaMm2, 'leather.neededAreaMm2', { min: 0 });
  const free = lots.reduce(
    (sum, lot, at) => sum.plus(readDecimal(lot.freeAreaMm2, `lots.${at}.freeAreaMm2`, { min: 0 })),
    new Exact(0),
  );
  const result = figures(neededAreaMm2, toAtMost(free, 3), 3);
  const takes = chooseLots(lots, neededAreaMm2);
  const ft2 = (area: DecimalText) => `${formatFootage(area)} ft²`;
  const from = takes.map((take) => `${ft2(take.takeAreaMm2)} from ${take.tag}`).join(', ');
  const sentence = result.ok
    ? `${name}: take ${from || 'nothing'}.`
    : `${name}: ${ft2(neededAreaMm2)} needed, ${ft2(result.free)} free, ${ft2(result.short)} short.`;
  return { about: 'leather', name, unit: 'mm2', ...result, sentence, lots: takes };
}

function hardwareAnswer(item: CheckInput['hardware'][number], at: number): Answer {
  readWhole(item.needed, `hardware.${at}.needed`);
  readWhole(item.free, `hardware.${at}.free`);
  const result = figures(String(item.needed), String(item.free), 0);
  const sentence = result.ok
    ? `${item.name}: take ${countWords(item.needed)} of ${countWords(item.free)} free.`
    : `${item.name}: ${countWords(item.needed)} needed, ${countWords(item.free)} free, ${countWords(result.short)} short.`;
  return { about: 'hardware', name: item.name, unit: 'piece', ...result, sentence };
}

function toolingAnswer(tool: CheckInput['tooling'][number], at: number): Answer {
  readWhole(tool.strikesNeeded, `tooling.${at}.strikesNeeded`);
  const life = tool.strikesLeft ?? tool.strikesNeeded;
  const free = tool.inShop ? readWhole(life, `tooling.${at}.strikesLeft`) : 0;
  const result = figures(String(tool.strikesNeeded), String(free), 0);
  const ok = result.ok && tool.inShop;
  return {
    about: 'tooling',
    name: tool.name,
    unit: 'strike',
    ...result,
    ok,
    sentence: toolSentence(tool, ok),
  };
}

function toolSentence(tool: CheckInput['tooling'][number], ok: boolean): string {
  if (!tool.inShop) return `${tool.name}: not in the shop yet.`;
  if (!ok) {
    return `${tool.name}: ${countWords(tool.strikesNeeded)} strikes needed, ${countWords(tool.strikesLeft ?? 0)} left in it: order a new one.`;
  }
  if (tool.strikesLeft === null) return `${tool.name}: ready.`;
  return `${tool.name}: ready, ${countWords(tool.strikesLeft)} strikes left in it.`;
}

function hoursAnswer({
  day,
  neededMinutes,
  freeMinutes,
}: NonNullable<CheckInput['hours']>): Answer {
  readDecimal(neededMinutes, 'hours.neededMinutes', { min: 0 });
  readDecimal(freeMinutes, 'hours.freeMinutes', { min: 0 });
  const result = figures(neededMinutes, freeMinutes, 4);
  const hours = (minutes: DecimalText) => toAtMost(new Exact(minutes).div(60), 1);
  const sentence = result.ok
    ? `Bench hours: ${hours(neededMinutes)} of the ${hours(freeMinutes)} free by ${day}.`
    : `Bench hours: ${hours(neededMinutes)} needed by ${day}, ${hours(freeMinutes)} free, ${hours(result.short)} short.`;
  return { about: 'hours', name: 'Bench hours', unit: 'minute', ...result, sentence };
}
