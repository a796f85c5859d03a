const words = new Intl.DateTimeFormat('en-GB', {
  weekday: 'short',
  day: 'numeric',
  month: 'short',
  year: 'numeric',
  timeZone: 'UTC',
});

/** A day in words, the same in every time zone: Mon 14 Dec 2026. */
export function sayDay(day: string): string {
  return words.format(new Date(`${day}T00:00:00Z`)).replace(',', '');
}
