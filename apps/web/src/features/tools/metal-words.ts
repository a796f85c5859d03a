import type { MetalAdviceReply } from '@hidewright/contract';
import { countText, moneyText } from '../../lib/formatting.ts';

type Turn = MetalAdviceReply['turns'][number];
type Bought = MetalAdviceReply['rows'][number]['now'];

/** Whether a plate must be bought at all, of which metal, and for how much. */
export function choiceText(
  { leastNow, leastInAll, impressionsInAll }: MetalAdviceReply,
  runs: number,
  currency: string,
): string {
  const lasts = 'The plate that is there lasts the run: none need be bought.';
  const now =
    leastNow === null ? lasts : `For this run ${boughtText(leastNow, currency)} costs least.`;
  if (runs === 0) return now;
  if (leastInAll === null) return 'The plate that is there lasts the run and its repeats.';
  const all = countText(impressionsInAll);
  return `${now} Over all ${all} impressions ${boughtText(leastInAll, currency)} costs least.`;
}

function boughtText(
  { metal, cost, plates }: NonNullable<MetalAdviceReply['leastNow']>,
  currency: string,
): string {
  const many = plates === 1 ? 'one new plate' : `${countText(plates)} new plates`;
  return `${metal}, ${many} for ${moneyText(cost)} ${currency},`;
}

/** "Brass pays from 70,001 impressions on: …" */
export function turnText({ cheap, dear, from }: Turn, left: number): string {
  const name = dear.charAt(0).toUpperCase() + dear.slice(1);
  if (from === null) return `${name} never costs less than buying ${cheap} again.`;
  const counted = left > 0 ? ', those of the plate that is there included' : '';
  return `${name} pays from ${countText(from)} impressions on${counted}: before that, buying ${cheap} again costs no more.`;
}

/** How often the press stops for the next plate, and first after how many. */
export function changesText({ changes, firstChangeAfter }: Bought): string {
  if (changes === 0 || firstChangeAfter === null) return 'never';
  const first = `after ${countText(firstChangeAfter)}`;
  return changes === 1 ? `once, ${first}` : `${countText(changes)} times, first ${first}`;
}
