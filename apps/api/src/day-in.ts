/** The calendar day of an instant in a time zone, as YYYY-MM-DD. */
export function dayIn(timeZone: string, instant: Date): string {
  return new Intl.DateTimeFormat('en-CA', { timeZone, dateStyle: 'short' }).format(instant);
}
