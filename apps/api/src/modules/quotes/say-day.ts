/** A day in words, the same in every time zone: Mon 14 Dec 2026. */
export function sayDay(day: string): string {
  const parts = {
    weekday: 'short',
    day: 'numeric',
    month: 'short',
    year: 'numeric',
    timeZone: 'UTC',
  } as const;
  return new Intl.DateTimeFormat('en-GB', parts)
    .format(new Date(`${day}T00:00:00Z`))
    .replace(',', '');
}

/** The shop's calendar day of an instant that was stored. */
export function dayOf(instant: string, timeZone: string): string {
  return new Intl.DateTimeFormat('en-CA', { timeZone, dateStyle: 'short' }).format(
    new Date(instant),
  );
}
