import { readWhole } from '../numbers/decimal-text.ts';
import { addDays, type Day, daysBetween, weekday } from './day.ts';

/** Whether the bench is worked on that day: Monday to Friday, and none of the days off. @throws InvalidInput */
export function isWorkday(day: Day, daysOff: readonly Day[] = []): boolean {
  return weekday(day) <= 5 && !daysOff.includes(day);
}

/**
 * The workday so many workdays after a day, or before it where the count is below zero. With 0 the
 * day itself comes back, workday or not.
 * @param count -5,000 to 5,000
 * @throws InvalidInput
 */
export function addWorkdays(day: Day, count: number, daysOff: readonly Day[] = []): Day {
  readWhole(count, 'count', -5000, 5000);
  const step = Math.sign(count);
  let [at, left] = [addDays(day, 0), Math.abs(count)];
  while (left > 0) {
    at = addDays(at, step);
    if (isWorkday(at, daysOff)) left -= 1;
  }
  return at;
}

/**
 * Workdays after `from` up to and including `to`; below zero where `to` comes first. From a Friday
 * to the next Monday it is 1.
 * @throws InvalidInput
 */
export function workdaysBetween(from: Day, to: Day, daysOff: readonly Day[] = []): number {
  const days = daysBetween(from, to);
  if (days < 0) return -workdaysBetween(to, from, daysOff);
  let count = 0;
  for (let at = 1; at <= days; at += 1) {
    if (isWorkday(addDays(from, at), daysOff)) count += 1;
  }
  return count;
}
