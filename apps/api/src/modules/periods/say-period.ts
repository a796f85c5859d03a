const words = new Intl.DateTimeFormat('en-GB', { dateStyle: 'long', timeZone: 'UTC' });

/** A day for a sentence of the books: "14 December 2026". */
export const sayDate = (day: string): string => words.format(new Date(`${day}T00:00:00Z`));

/** Days for a sentence: "1 November 2026 to 30 November 2026". */
export const sayPeriod = (period: { fromDay: string; toDay: string }): string =>
  `${sayDate(period.fromDay)} to ${sayDate(period.toDay)}`;
