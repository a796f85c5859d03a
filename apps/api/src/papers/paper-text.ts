/** An amount or price as printed: its own decimals, thousands set apart. */
export function printedNumber(text: string, digits: number): string {
  const places = Math.max(digits, text.split('.')[1]?.replace(/0+$/, '').length ?? 0);
  const format = new Intl.NumberFormat('en', {
    minimumFractionDigits: places,
    maximumFractionDigits: places,
  });
  return format.format(text as Intl.StringNumericLiteral);
}

const longDay = new Intl.DateTimeFormat('en-GB', { dateStyle: 'long', timeZone: 'UTC' });

/** A calendar day as printed: 14 December 2026. */
export function printedDay(day: string): string {
  return longDay.format(new Date(`${day}T00:00:00Z`));
}
