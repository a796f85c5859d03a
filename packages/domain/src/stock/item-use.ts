import { InvalidInput } from '../errors/domain-error.ts';
import { readNumber } from '../numbers/read-number.ts';
import { crostonForecast, smoothedUse, type CrostonForecast } from './forecast.ts';
import { meanAndSpread } from './spread.ts';

/** How an item was used, and how it is expected to go on; all figures per period. */
export interface ItemUse {
  periodDays: 7 | 28;
  /** oldest first; its last period ends today */
  series: number[];
  mean: number;
  sd: number;
  /** share of the periods without use, 0 to 1 */
  idleShare: number;
  /** 'too little' where it was not used, or is known for less than eight weeks */
  method: 'smoothing' | 'croston' | 'too little';
  /** 0 where there is too little to go by */
  forecast: number;
  croston: CrostonForecast | null;
}

/** Below this, a few weeks would pass for a habit. */
const fewestWeeks = 8;
/**
 * Periods from one use to the next above which use counts as rare (Syntetos, Boylan and Croston,
 * Journal of the Operational Research Society 56, 2005; from memory).
 */
const rareFrom = 1.32;
/** How much of what a forecast was off by is taken over each period: common practice, no source. */
export const useAlphas = { smoothing: 0.2, croston: 0.1 } as const;

/**
 * What the ledger says of an item's use. Week by week where nearly every week has some, else by four
 * weeks; smoothed from the mean on where use is steady, by Croston's method where it is rare.
 * @param weeks use of each week, oldest first, at most 52; pieces, or mm² of leather; 0 or more
 * @throws InvalidInput
 */
export function itemUse(weeks: readonly number[]): ItemUse {
  if (weeks.length > 52) throw new InvalidInput('weeks', 'Give at most 52 weeks.');
  weeks.forEach((use, at) => readNumber(use, `weeks.${at}`, { min: 0 }));
  const known = weeks.length >= fewestWeeks && weeks.some((use) => use > 0);
  if (!known) return { ...describe(7, weeks), method: 'too little', forecast: 0, croston: null };
  if (isSteady(weeks)) return smoothed(7, weeks);
  const months = byFour(weeks);
  if (isSteady(months)) return smoothed(28, months);
  if (!months.some((use) => use > 0)) {
    // All of it lies in the oldest weeks, which make up no whole period.
    return { ...describe(28, months), method: 'too little', forecast: 0, croston: null };
  }
  const croston = crostonForecast(months, useAlphas.croston);
  return { ...describe(28, months), method: 'croston', forecast: croston.forecast, croston };
}

function smoothed(periodDays: ItemUse['periodDays'], series: readonly number[]): ItemUse {
  const described = describe(periodDays, series);
  const forecast = smoothedUse(series, useAlphas.smoothing, described.mean);
  return { ...described, method: 'smoothing', forecast, croston: null };
}

function describe(periodDays: ItemUse['periodDays'], series: readonly number[]) {
  const idle = series.filter((use) => use === 0).length;
  return {
    periodDays,
    series: [...series],
    ...meanAndSpread(series),
    idleShare: series.length === 0 ? 1 : idle / series.length,
  };
}

const isSteady = (series: readonly number[]): boolean =>
  series.length / series.filter((use) => use > 0).length <= rareFrom;

/** Four weeks each, counted back from today; the oldest weeks that make up no four are left out. */
function byFour(weeks: readonly number[]): number[] {
  const first = weeks.length % 4;
  return Array.from({ length: Math.floor(weeks.length / 4) }, (_, at) =>
    weeks.slice(first + at * 4, first + at * 4 + 4).reduce((sum, use) => sum + use, 0),
  );
}

/** Expected use of one day. */
export const dailyUse = ({ forecast, periodDays }: ItemUse): number => forecast / periodDays;
