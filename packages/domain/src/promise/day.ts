import { InvalidInput } from '../errors/domain-error.ts';

/** A calendar date, 'YYYY-MM-DD'. */
export type Day = string;

const shape = /^(\d{4})-(\d{2})-(\d{2})$/;

/**
 * Days since 1970-01-01 in the Gregorian calendar, by counting years from March, so that the leap
 * day ends a year.
 * @throws InvalidInput for what is no date, such as 2027-02-29
 */
export function dayNumber(day: Day, field = 'day'): number {
  const [, year, month, date] = (shape.exec(day) ?? []).map(Number);
  if (year === undefined || month === undefined || date === undefined) throw notADay(field);
  const inCalendar = month >= 1 && month <= 12 && date >= 1 && date <= lengthOf(year, month);
  if (!inCalendar) throw notADay(field);
  return countDays(year, month, date);
}

/** Days of a month. */
function lengthOf(year: number, month: number): number {
  if (month === 2) return year % 4 === 0 && (year % 100 !== 0 || year % 400 === 0) ? 29 : 28;
  return [4, 6, 9, 11].includes(month) ? 30 : 31;
}

const notADay = (field: string): InvalidInput =>
  new InvalidInput(field, 'Write the day as year-month-day, such as 2027-03-31.');

const daysPer400Years = 146_097;
const daysTo1970FromMarch0 = 719_468;

function countDays(year: number, month: number, date: number): number {
  const marchYear = month > 2 ? year : year - 1;
  const marchMonth = (month + 9) % 12;
  const dayOfYear = Math.floor((153 * marchMonth + 2) / 5) + date - 1;
  const leapDays =
    Math.floor(marchYear / 4) - Math.floor(marchYear / 100) + Math.floor(marchYear / 400);
  return 365 * marchYear + leapDays + dayOfYear - daysTo1970FromMarch0;
}

/** The date of a day number. */
export function dayFromNumber(number: number): Day {
  const sinceMarch0 = number + daysTo1970FromMarch0;
  let marchYear = Math.floor((sinceMarch0 * 400) / daysPer400Years) + 1;
  const firstOf = (year: number) =>
    365 * year + Math.floor(year / 4) - Math.floor(year / 100) + Math.floor(year / 400);
  while (firstOf(marchYear) > sinceMarch0) marchYear -= 1;
  const dayOfYear = sinceMarch0 - firstOf(marchYear);
  const marchMonth = Math.floor((5 * dayOfYear + 2) / 153);
  const date = dayOfYear - Math.floor((153 * marchMonth + 2) / 5) + 1;
  const month = ((marchMonth + 2) % 12) + 1;
  const year = month > 2 ? marchYear : marchYear + 1;
  return `${pad(year, 4)}-${pad(month, 2)}-${pad(date, 2)}`;
}

const pad = (value: number, length: number): string => String(value).padStart(length, '0');

/** So many calendar days later (or, below zero, earlier). @throws InvalidInput */
export function addDays(day: Day, count: number): Day {
  return dayFromNumber(dayNumber(day) + count);
}

/** Calendar days from one day to another. @throws InvalidInput */
export function daysBetween(from: Day, to: Day): number {
  return dayNumber(to, 'to') - dayNumber(from, 'from');
}

/** 1 for Monday to 7 for Sunday, as in ISO 8601. @throws InvalidInput */
export function weekday(day: Day): number {
  return ((((dayNumber(day) + 3) % 7) + 7) % 7) + 1;
}
