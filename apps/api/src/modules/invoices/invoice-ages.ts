import { Decimal } from 'decimal.js';
import type { AgeBand, OwedInvoice } from '@hidewright/contract';
import { moneyText } from '../../http/decimal-text.ts';

const bands: readonly [AgeBand, longestLate: number][] = [
  ['not due', 0],
  ['1 to 30', 30],
  ['31 to 60', 60],
  ['61 to 90', 90],
  ['over 90', Infinity],
];

const daysAfter = (day: string, before: string) =>
  (Date.parse(day) - Date.parse(before)) / 86_400_000;

/** How late an open invoice is on a day. */
export function aged(invoice: Omit<OwedInvoice, 'band' | 'daysLate'>, onDay: string): OwedInvoice {
  const daysLate = Math.max(0, daysAfter(onDay, invoice.dueOn));
  const band = bands.find(([, longest]) => daysLate <= longest)?.[0] ?? 'over 90';
  return { ...invoice, daysLate, band };
}

/** What is owed in each band, and altogether. */
export function sumByAge(items: OwedInvoice[]) {
  const sum = (some: OwedInvoice[]) =>
    moneyText(some.reduce((total, item) => total.plus(item.open), new Decimal(0)));
  return {
    bands: bands.map(([band]) => {
      const inBand = items.filter((item) => item.band === band);
      return { band, count: inBand.length, open: sum(inBand) };
    }),
    open: sum(items),
  };
}
