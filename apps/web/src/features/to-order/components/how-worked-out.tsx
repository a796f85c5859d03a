import type { OrderSuggestionReply } from '@hidewright/contract';
import type { ReactNode } from 'react';
import { moneyText, numberText } from '../../../lib/formatting.ts';
import { useWorkshop } from '../../../lib/workshop.tsx';
import {
  amountText,
  leadDaysText,
  leadWords,
  methodWords,
  periodWord,
  soldWords,
} from '../to-order-words.ts';
import { UseBars } from './use-bars.tsx';

interface HowWorkedOutProps {
  item: OrderSuggestionReply;
  orderCost: string | undefined;
  holdingPercent: string;
  servicePercent: string;
}

/** Use, forecast, point and quantity; each figure opens what it comes from. */
export function HowWorkedOut({ item, ...rates }: HowWorkedOutProps) {
  const workshop = useWorkshop();
  const say = (value: string) => amountText(value, item, workshop);
  const { usage, workedOut } = item;
  const period = periodWord(item);
  return (
    <section aria-label={`How ${item.name} is worked out`} className="space-y-2">
      <h3 className="font-semibold">How it is worked out</h3>
      <UseBars item={item} say={say} />
      <Worked
        word={`Used in ${period === 'week' ? 'a week' : 'four weeks'}`}
        figure={`${say(usage.mean)} on average, give or take ${say(usage.sd)}`}
      >
        {`What jobs took, less what they gave back, in the last ${(usage.series.length * usage.periodDays) / 7} weeks: their mean, and their standard deviation.`}
      </Worked>
      <Worked
        word="Expected"
        figure={
          usage.method === 'too little'
            ? 'too little to go by'
            : `${say(usage.forecast)} in ${period === 'week' ? 'a week' : 'four weeks'}`
        }
      >
        {methodWords(item, say)}
      </Worked>
      <Worked word="A delivery takes" figure={leadDaysText(item)}>
        {leadWords(item)}
      </Worked>
      {workedOut && (
        <Worked word="In reserve" figure={say(workedOut.safety)}>
          {`So much that stock lasts until the delivery ${numberText(rates.servicePercent, 2)} times in 100: z × √(time of a delivery × spread of the use² + expected use² × spread of the delivery’s time²), the time counted in periods, z from the normal distribution.`}
        </Worked>
      )}
      <Worked word="Order below" figure={say(item.point)}>
        {pointWords(item, say)}
      </Worked>
      <Worked word="One order" figure={say(item.usual)}>
        {quantityWords(item, say, rates, soldWords(item, workshop), workshop.currency)}
      </Worked>
    </section>
  );
}

interface WorkedProps {
  word: string;
  figure: string;
  children: ReactNode;
}

function Worked({ word, figure, children }: WorkedProps) {
  return (
    <details className="border-t border-stitch/60">
      <summary className="min-h-11 rounded py-2.5">
        {`${word}: `}
        <strong className="font-semibold">{figure}</strong>
      </summary>
      <p className="max-w-prose pb-3 text-ink-soft">{children}</p>
    </details>
  );
}

type Say = (value: string) => string;

function pointWords({ pointBy, workedOut, minimum }: OrderSuggestionReply, say: Say): string {
  const byUse =
    workedOut === null
      ? 'there is too little use to go by'
      : `by its use it would be ${say(workedOut.point)}: what is expected to go until a delivery, and the reserve`;
  if (pointBy === 'hand') return `Set by hand; ${byUse}. The minimum is ${say(minimum)}.`;
  return pointBy === 'use'
    ? `What is expected to go until a delivery, and the reserve. It is above the minimum of ${say(minimum)}, so it counts.`
    : `The minimum of ${say(minimum)} counts; ${byUse}.`;
}

function quantityWords(
  item: OrderSuggestionReply,
  say: Say,
  { orderCost, holdingPercent }: Omit<HowWorkedOutProps, 'item'>,
  sold: string,
  currency: string,
): string {
  const { economic, usualBy } = item;
  const costs =
    orderCost === undefined
      ? ''
      : ` An order costs ${moneyText(orderCost)} ${currency}, keeping a thing for a year ${numberText(holdingPercent, 2)} % of its price; the Office says so.`;
  const least =
    economic === null
      ? 'Without use or a price there is no quantity that costs least over a year.'
      : `Over a year ${say(economic)} at a time costs least: √(2 × use in a year × cost of an order ÷ cost of keeping one for a year), tried at each price break, and at most a year’s use.${costs}`;
  const packs = sold === '' ? '' : ` It is sold in ${sold}, so that is rounded up.`;
  const by = {
    hand: 'Set by hand. ',
    year: '',
    need: 'As much as is missing to the point, which is more than one usual order. ',
  }[economic === null && usualBy === 'need' ? 'year' : usualBy];
  return `${by}${least}${packs}`;
}
