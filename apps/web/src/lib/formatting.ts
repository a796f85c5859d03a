import { isPriceKnown, priceFromFt2, rackFootage, type AreaHabit } from '@hidewright/domain';
import { Decimal } from 'decimal.js';
import {
  areaFigure,
  areaUnits,
  lengthFigure,
  lengthUnits,
  type AreaUnit,
  type LengthUnit,
} from './units.ts';

const minus = '−';
const narrowSpace = '\u202f';
const weekdays = ['Sun', 'Mon', 'Tue', 'Wed', 'Thu', 'Fri', 'Sat'];
const longWeekdays = ['Sunday', 'Monday', 'Tuesday', 'Wednesday', 'Thursday', 'Friday', 'Saturday'];
const months = ['Jan', 'Feb', 'Mar', 'Apr', 'May', 'Jun', 'Jul', 'Aug', 'Sep', 'Oct', 'Nov', 'Dec'];

/** Groups the digits of an exact decimal text: nothing passes through a floating-point number. */
function grouped(text: string): string {
  const [whole = '0', fraction] = text.replace('-', '').split('.');
  const digits = whole.replace(/\B(?=(\d{3})+$)/g, ',');
  return `${text.startsWith('-') ? minus : ''}${digits}${fraction ? `.${fraction}` : ''}`;
}

/** 1234.5 → 1,234.50. The currency is said once, where the column or the page is named. */
export function moneyText(amount: string, places = 2): string {
  return grouped(new Decimal(amount).toFixed(places));
}

/** A unit price: two decimals, or as many more as it has. */
export function unitPriceText(price: string): string {
  const exact = new Decimal(price);
  return grouped(exact.toFixed(Math.min(Math.max(exact.decimalPlaces(), 2), 4)));
}

export function countText(count: number): string {
  return grouped(String(count));
}

export function numberText(value: string, places: number): string {
  return grouped(new Decimal(value).toDecimalPlaces(places).toFixed());
}

export function percentText(value: string, places = 1): string {
  return `${numberText(value, places)}${narrowSpace}%`;
}

export function minutesText(value: string): string {
  return `${numberText(value, 1)} min`;
}

/** Minutes as hours: 186 → 3.1 h. */
export function hoursText(minutes: string): string {
  return `${numberText(new Decimal(minutes).div(60).toFixed(4), 1)} h`;
}

export function areaText(areaMm2: string, unit: AreaUnit, places = 2): string {
  return `${grouped(areaFigure(areaMm2, unit, places))} ${areaUnits[unit].sign}`;
}

/** An area on the rack as the shop says it: 24.8 ft² in tenths, 24³ ft² in quarters. */
export function rackAreaText(areaMm2: string, habit: AreaHabit): string {
  const footage = rackFootage(areaMm2, habit);
  if (footage === undefined) return areaText(areaMm2, habit.areaUnit);
  const [, whole = '', raised = ''] = /^(.*?)([¹²³]?)$/.exec(footage) ?? [];
  return `${grouped(whole)}${raised} ${areaUnits.ft2.sign}`;
}

/** What is asked for one of what the shop buys; of leather the price of a ft², said in the shop's unit. */
export function askedPriceText(price: string, unit?: AreaUnit): string {
  if (!isPriceKnown(price)) return 'not known';
  return unit === undefined ? unitPriceText(price) : areaPriceText(price, unit);
}

/** The price of a ft² in the shop's unit, without it: 9.50, or 1.0226 for a dm². */
export function areaPriceText(pricePerFt2: string, unit: AreaUnit): string {
  return unitPriceText(priceFromFt2(pricePerFt2, unit));
}

export function lengthText(lengthMm: string, unit: LengthUnit, places?: number): string {
  return `${lengthFigure(lengthMm, unit, places)} ${lengthUnits[unit].sign}`;
}

/** 11 × 13 in */
export function sizeText(widthMm: string, heightMm: string, unit: LengthUnit): string {
  const [width, height] = [lengthFigure(widthMm, unit), lengthFigure(heightMm, unit)];
  return `${width} × ${height} ${lengthUnits[unit].sign}`;
}

function dayParts(day: string) {
  const [year = 0, month = 1, date = 1] = day.slice(0, 10).split('-').map(Number);
  const weekday = new Date(Date.UTC(year, month - 1, date)).getUTCDay();
  return { year, month: months[month - 1] ?? '', date, weekday };
}

/** Mon 14 Dec, with the year where it is another than today's. */
export function dayText(day: string, today?: string): string {
  const { year, month, date, weekday } = dayParts(day);
  const other = today !== undefined && today.slice(0, 4) !== String(year).padStart(4, '0');
  return `${weekdays[weekday]} ${date} ${month}${other ? ` ${year}` : ''}`;
}

const longMonth = new Intl.DateTimeFormat('en', { month: 'long', timeZone: 'UTC' });

/** Monday 14 December */
export function longDayText(day: string): string {
  const { date, weekday } = dayParts(day);
  return `${longWeekdays[weekday]} ${date} ${longMonth.format(new Date(`${day.slice(0, 10)}T00:00:00Z`))}`;
}

/** An instant in the workshop's time: Mon 14 Dec, 08:40, with the year where it is another than today's. */
export function instantText(instant: string, timeZone: string, today?: string): string {
  const parts = new Intl.DateTimeFormat('en-GB', {
    timeZone,
    year: 'numeric',
    month: '2-digit',
    day: '2-digit',
    hour: '2-digit',
    minute: '2-digit',
  }).formatToParts(new Date(instant));
  const part = (type: string) => parts.find((found) => found.type === type)?.value ?? '';
  const day = `${part('year')}-${part('month')}-${part('day')}`;
  return `${dayText(day, today)}, ${part('hour')}:${part('minute')}`;
}
