import { Decimal } from 'decimal.js';
import { invoiceTotals, minorDigits } from '@hidewright/domain';
import type { Work } from '../../work.ts';
import { Workshop } from '../workshop/workshop.entity.ts';
import type { Invoice } from './invoice.entity.ts';
import { InvoiceLine } from './invoice-line.entity.ts';
import { InvoiceTax } from './invoice-tax.entity.ts';

/** Decimals of the amounts in the shop's currency. */
export async function currencyDigits(work: Work): Promise<0 | 2> {
  const workshop = await work.em.findOneOrFail(Workshop, 1);
  return minorDigits(workshop.currency);
}

/** Works out a draft's tax by rate and its totals from its lines, and keeps them. */
export async function sumUp(work: Work, invoice: Invoice): Promise<void> {
  const lines = await work.em.find(InvoiceLine, { invoiceId: invoice.id });
  const taxed = lines.map((line) => ({
    amount: line.amount.toFixed(),
    taxRatePercent: line.taxRateId === null ? null : line.taxPercent.toFixed(),
  }));
  const totals = invoiceTotals(taxed, await currencyDigits(work));
  await work.em.nativeDelete(InvoiceTax, { invoiceId: invoice.id });
  for (const { ratePercent, net, tax } of totals.taxes) {
    work.em.create(InvoiceTax, {
      invoiceId: invoice.id,
      percent: new Decimal(ratePercent),
      net: new Decimal(net),
      tax: new Decimal(tax),
    });
  }
  invoice.net = new Decimal(totals.net);
  invoice.tax = new Decimal(totals.tax);
  invoice.total = new Decimal(totals.total);
  await work.em.flush();
}
