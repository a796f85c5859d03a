import type { OrderSuggestionReply } from '@hidewright/contract';
import { isPriceKnown, unitWord, wholes } from '@hidewright/domain';
import { Decimal } from 'decimal.js';
import {
  countText,
  moneyText,
  numberText,
  rackAreaText,
  unitPriceText,
} from '../../lib/formatting.ts';
import type { Workshop } from '../../lib/workshop.tsx';

type Item = OrderSuggestionReply;
type Unit = Pick<Item, 'unit'>;

/** A quantity as people say it: 1,250, 12 pairs, 40 m, or 24.8 ft². */
export function amountText(value: string, { unit }: Unit, workshop: Workshop): string {
  if (unit === 'mm2') return rackAreaText(value, workshop);
  const rounded = new Decimal(value).toDecimalPlaces(Math.abs(Number(value)) < 10 ? 1 : 0);
  const figure = rounded.isInteger() ? countText(rounded.toNumber()) : rounded.toFixed();
  const word = unitWord(unit, rounded.toNumber());
  return unit === 'piece' ? figure : `${figure} ${word}`;
}

/** How much of what is on hand is held; where a count found less than that, how much is missing. */
export function heldNote(
  { onHand, reserved }: Pick<Item, 'onHand' | 'reserved'>,
  say: (value: string) => string,
): string | undefined {
  if (Number(reserved) === 0) return undefined;
  const missing = new Decimal(reserved).minus(onHand);
  return missing.greaterThan(0)
    ? `${say(reserved)} held, ${say(missing.toFixed())} of it missing`
    : `${say(reserved)} of it held`;
}

/** As it is sold: whole sides of about 22 ft², or packs of 100, at least 500. */
export function soldWords(item: Item, workshop: Workshop): string {
  const { least, multiple, whole, of } = item;
  const say = (value: string) => amountText(value, item, workshop);
  const packs =
    whole !== null && multiple === whole.areaMm2
      ? `whole ${wholes({ count: 2, form: whole.form })} of about ${say(whole.areaMm2)}`
      : multiple !== null && Number(multiple) > 1 && of === 'hardware'
        ? `packs of ${say(multiple)}`
        : '';
  const minimum = least === null || least === multiple ? '' : `at least ${say(least)}`;
  return [packs, minimum].filter(Boolean).join(', ');
}

/** 66 ft² as three sides; nothing where it is not bought whole. */
export function wholeWords(quantity: string, { whole }: Pick<Item, 'whole'>): string {
  if (whole === null) return '';
  const count = new Decimal(quantity).div(whole.areaMm2).toDecimalPlaces(1).toNumber();
  return `${count} ${wholes({ count, form: whole.form })}`;
}

/** 85.00 USD, 0.17 each; nothing for those who may not see prices. */
export function priceWords(
  { of, amount, unitPrice }: Pick<Item, 'of' | 'amount' | 'unitPrice'>,
  { currency }: Pick<Workshop, 'currency'>,
): string {
  if (amount === undefined || unitPrice === undefined) return '';
  if (!isPriceKnown(unitPrice)) return 'price not known';
  const each = of === 'leather' ? 'a ft²' : 'each';
  return `${moneyText(amount)} ${currency}, ${unitPriceText(unitPrice)} ${each}`;
}

export const periodWord = ({ usage }: Pick<Item, 'usage'>): string =>
  usage.periodDays === 7 ? 'week' : 'four weeks';

/** How the expected use comes about. */
export function methodWords(item: Item, say: (value: string) => string): string {
  const { method, idlePercent, size, interval, series } = item.usage;
  const idle = numberText(idlePercent, 0);
  const period = periodWord(item);
  if (method === 'too little') {
    return series.length < 8 && item.usage.periodDays === 7
      ? 'It is known for less than eight weeks: the minimum alone counts.'
      : 'It was not used in the last twelve months: the minimum alone counts.';
  }
  if (method === 'smoothing') {
    return `Its use is steady: ${idle} % of the periods are without any. So the mean is moved, one period after the other, by a fifth of what each differed from what was expected (smoothing): what is recent counts most.`;
  }
  return `Its use is rare: ${idle} % of the periods are without any, where more than 24 % count as rare. So how much at a time (${say(size ?? '0')}) and how long from one use to the next (${numberText(interval ?? '0', 1)} times ${period}) are smoothed each by itself; the one divided by the other is the expected use (Croston’s method).`;
}

/** How long a delivery takes, and who says so. */
/** "6.4 days", as long as anybody is named who delivers. */
export const leadDaysText = ({ lead, supplierName }: Item): string =>
  supplierName === null ? 'not known' : daysText(numberText(lead.meanDays, 1));

const daysText = (days: string): string => `${days} ${days === '1' ? 'day' : 'days'}`;

export function leadWords({ lead, supplierName }: Item): string {
  const days = daysText(numberText(lead.meanDays, 1));
  if (supplierName === null) return 'Nobody is named who sells it.';
  return lead.deliveries === 0
    ? `${supplierName} says ${days}. From three deliveries on, what they took counts instead.`
    : `The last ${lead.deliveries} deliveries of ${supplierName} took ${days} on average, give or take ${numberText(lead.sdDays, 1)}.`;
}
