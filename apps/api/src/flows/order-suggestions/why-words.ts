import { dailyUse, type Dated } from '@hidewright/domain';
import { sayDay } from '../../say-day.ts';
import type { Suggested } from './suggest-orders.ts';

/** How the shop says quantities of a thing: 1,250, or 24.5 ft². */
export type Say = (quantity: number) => string;

/** Why a thing should be ordered or not, and why so much; for the maker as well: never a price. */
export function whyWords(item: Suggested, say: Say, dueOn: string | null): string {
  const { overdue } = item.open;
  const late = overdue.length === 0 ? '' : `${overdue.join(' and ')} should have come by now.`;
  return [...standing(item, say, dueOn), late].filter((words) => words !== '').join(' ');
}

function standing(item: Suggested, say: Say, dueOn: string | null): string[] {
  const { state, point } = item.suggestion;
  const have = haveWords(item, say);
  const mark = pointWords(item, say);
  if (state === 'now')
    return [`${have}, below ${mark}.`, draftWords(item, say), orderWords(item, say)];
  if (state === 'drafted') {
    return [`${have}, below ${mark}.`, `What is on ${draftNames(item)} will do once it is sent.`];
  }
  if (state === 'soon') {
    const when = dueOn === null ? '' : ` about ${sayDay(dueOn)}`;
    return [`${have}. At ${rateWords(item, say)} it falls below ${mark}${when}.`];
  }
  if (point === 0) return [`${have}: enough, as long as it has no minimum and little use.`];
  return [`${have}: enough. It is ordered below ${say(point)}.`];
}

function haveWords({ amounts, promised, suggestion }: Suggested, say: Say): string {
  const { free, onOrder } = amounts;
  const { position } = suggestion;
  const have = `${freeWords(free, say)}${onOrder > 0 ? ` and ${say(onOrder)} on order` : ''}`;
  if (amounts.promised === 0) return have;
  if (position < 0) return `${say(-position)} missing for ${jobWords(promised)}. ${have}`;
  return `${have}, ${say(amounts.promised)} promised beyond what is held, which leaves ${say(position)}`;
}

/** For whom it is missing: J-0001 Winter ale coasters; of many, the first. */
function jobWords(promised: readonly Dated[]): string {
  const [first, second, ...others] = [...new Set(promised.flatMap(({ paper }) => paper ?? []))];
  if (first === undefined) return 'what is promised';
  if (second === undefined) return first;
  return others.length === 0 ? `${first} and ${second}` : `${first} and ${others.length + 1} more`;
}

const freeWords = (free: number, say: Say): string =>
  free === 0 ? 'None free' : `${say(free)} free`;

function pointWords({ suggestion, sold, ...item }: Suggested, say: Say): string {
  const { point, pointBy } = suggestion;
  if (pointBy === 'hand') return `the ${say(point)} set by hand`;
  if (pointBy === 'minimum') return point === 0 ? 'nothing' : `the minimum of ${say(point)}`;
  const days = Math.round(sold.lead.meanDays);
  return `the ${say(point)} that last until a delivery: it takes about ${days} ${days === 1 ? 'day' : 'days'}, at ${rateWords(item, say)}`;
}

const rateWords = ({ use }: Pick<Suggested, 'use'>, say: Say): string =>
  `about ${say(dailyUse(use) * 7)} a week`;

function draftWords({ amounts, ...item }: Suggested, say: Say): string {
  return amounts.drafted > 0 ? `${say(amounts.drafted)} on ${draftNames(item)} is not enough.` : '';
}

const draftNames = ({ open }: Pick<Suggested, 'open'>): string =>
  `draft ${open.drafts.map(({ number }) => number).join(' and ')}`;

function orderWords({ suggestion, use }: Suggested, say: Say): string {
  const quantity = Number(suggestion.quantity);
  const { usualBy } = suggestion;
  if (usualBy === 'hand') return `Order ${say(quantity)}, as set by hand.`;
  if (usualBy === 'need') return `Order ${say(quantity)} to fill it up.`;
  const weeks = Math.max(1, Math.round(quantity / (dailyUse(use) * 7)));
  return `Order ${say(quantity)}: ${weeks === 1 ? 'a week’s' : `about ${weeks} weeks’`} use, which costs least over a year.`;
}
