const calendars = new Map<string, Intl.DateTimeFormat>();

/** The calendar day of an instant in a time zone, as YYYY-MM-DD. */
export function dayIn(timeZone: string, instant: Date): string {
  return calendarOf(timeZone).format(instant);
}

/** Made once for each time zone: that takes longer than what it is made for. */
function calendarOf(timeZone: string): Intl.DateTimeFormat {
  const known = calendars.get(timeZone);
  if (known !== undefined) return known;
  const made = new Intl.DateTimeFormat('en-CA', { timeZone, dateStyle: 'short' });
  calendars.set(timeZone, made);
  return made;
}
