import type { Decimal } from 'decimal.js';
import { type DecimalText, Exact, readDecimal, toPlaces, toText } from '../numbers/decimal-text.ts';

export interface TaxedLine {
  /** line amount without tax, already rounded */
  amount: DecimalText;
  /** per cent, or null where no tax applies */
  taxRatePercent: DecimalText | null;
}

export interface TaxAtRate {
  ratePercent: DecimalText;
  net: DecimalText;
  tax: DecimalText;
}

export interface InvoiceTotals {
  net: DecimalText;
  taxes: TaxAtRate[];
  tax: DecimalText;
  total: DecimalText;
}

/**
 * Totals of an invoice. Tax is worked out once per rate on that rate's summed net and rounded half
 * up, never per line (EN 16931-1, rules BR-CO-17 and BR-S-08). Rates come in rising order.
 * @param digits decimals of the currency
 * @throws InvalidInput
 */
export function invoiceTotals(lines: readonly TaxedLine[], digits = 2): InvoiceTotals {
  const byRate = new Map<DecimalText, Decimal>();
  let net: Decimal = new Exact(0);
  lines.forEach((line, at) => {
    const amount = readDecimal(line.amount, `lines.${at}.amount`, { places: digits });
    net = net.plus(amount);
    if (line.taxRatePercent === null) return;
    const rate = toText(
      readDecimal(line.taxRatePercent, `lines.${at}.taxRatePercent`, { min: 0, max: 100 }),
    );
    byRate.set(rate, (byRate.get(rate) ?? new Exact(0)).plus(amount));
  });
  const taxes = [...byRate]
    .sort(([a], [b]) => new Exact(a).comparedTo(b))
    .map(([rate, sum]) => taxAtRate(rate, sum, digits));
  const tax = taxes.reduce((total, each) => total.plus(each.tax), new Exact(0));
  return {
    net: toPlaces(net, digits),
    taxes,
    tax: toPlaces(tax, digits),
    total: toPlaces(net.plus(tax), digits),
  };
}

const taxAtRate = (ratePercent: DecimalText, net: Decimal, digits: number): TaxAtRate => ({
  ratePercent,
  net: toPlaces(net, digits),
  tax: toPlaces(net.times(ratePercent).div(100), digits),
});
