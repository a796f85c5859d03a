import { addDays } from '@hidewright/domain';

const calendars = new Map<string, Intl.DateTimeFormat>();

/** The calendar day of an instant in a time zone, as YYYY-MM-DD. */
export function dayIn(timeZone: string, instant: Date): string {
  return calendarOf(timeZone).format(instant);
}

/** The end of a day in a time zone: its date, and the first instant after it. */
export interface DayOver {
  on: string;
  over: string;
}

export const dayOver = (timeZone: string, on: string): DayOver => ({
  on,
  over: endOfDay(timeZone, on).toISOString(),
});

/** At most 15 hours from midnight at Greenwich, wherever that is. */
function endOfDay(timeZone: string, day: string): Date {
  const midnight = Date.parse(`${addDays(day, 1)}T00:00:00Z`);
  let [before, after] = [midnight - mostHours, midnight + mostHours];
  while (after - before > 1) {
    const between = Math.floor((before + after) / 2);
    if (dayIn(timeZone, new Date(between)) > day) after = between;
    else before = between;
  }
  return new Date(after);
}

const mostHours = 15 * 3_600_000;

/** Made once for each time zone: that takes longer than what it is made for. */
function calendarOf(timeZone: string): Intl.DateTimeFormat {
  const known = calendars.get(timeZone);
  if (known !== undefined) return known;
  const made = new Intl.DateTimeFormat('en-CA', { timeZone, dateStyle: 'short' });
  calendars.set(timeZone, made);
  return made;
}
