import { createHash } from 'node:crypto';
import { minorDigits } from '@hidewright/domain';
import { moneyText, priceText } from '../../http/decimal-text.ts';
import type { InvoiceSnapshot } from '../../papers/invoice-pdf.ts';
import type { Work } from '../../work.ts';
import { Customer } from '../customers/customer.entity.ts';
import { Order } from '../orders/order.entity.ts';
import { TaxRate } from '../tax-rates/tax-rate.entity.ts';
import { Workshop } from '../workshop/workshop.entity.ts';
import type { Invoice } from './invoice.entity.ts';
import { InvoiceLine } from './invoice-line.entity.ts';
import { InvoiceTax } from './invoice-tax.entity.ts';
import { soldFromShelf } from './whose-draft.ts';

/** What an invoice says at this moment, but for the number and days that issuing gives it. */
export type Wording = Omit<InvoiceSnapshot, 'number' | 'issuedOn' | 'dueOn'>;

export async function wordingOf({ em }: Work, invoice: Invoice): Promise<Wording> {
  const workshop = await em.findOneOrFail(Workshop, 1);
  const customer = await em.findOneOrFail(Customer, invoice.customerId);
  const order = invoice.orderId === null ? null : await em.findOneOrFail(Order, invoice.orderId);
  const taxes = await em.find(
    InvoiceTax,
    { invoiceId: invoice.id },
    { orderBy: { percent: 'asc' } },
  );
  return {
    orderNumber: order?.number ?? null,
    title: order?.title ?? soldFromShelf,
    currency: workshop.currency,
    digits: minorDigits(workshop.currency),
    workshop: { name: workshop.name, address: workshop.address, taxNumber: workshop.taxNumber },
    billedTo: { name: customer.name, contactName: customer.contactName, address: customer.address },
    lines: await wordLines(em, invoice),
    taxes: taxes.map(({ percent, net, tax }) => ({
      percent: percent.toString(),
      net: moneyText(net),
      tax: moneyText(tax),
    })),
    net: moneyText(invoice.net),
    tax: moneyText(invoice.tax),
    total: moneyText(invoice.total),
  };
}

async function wordLines(em: Work['em'], invoice: Invoice): Promise<InvoiceSnapshot['lines']> {
  const lines = await em.find(
    InvoiceLine,
    { invoiceId: invoice.id },
    { orderBy: { position: 'asc' } },
  );
  const rates = await em.find(TaxRate, {});
  const nameOf = (id: number) => rates.find((rate) => rate.id === id)?.name ?? null;
  return lines.map((line) => ({
    position: line.position,
    description: line.description,
    quantity: line.quantity,
    unitPrice: priceText(line.unitPrice),
    amount: moneyText(line.amount),
    taxPercent: line.taxRateId === null ? null : line.taxPercent.toString(),
    taxName: line.taxRateId === null ? null : nameOf(line.taxRateId),
  }));
}

/** The snapshot as it is kept has this hash for as long as nobody changes it. */
export const snapshotHash = (snapshot: unknown): string =>
  createHash('sha256').update(JSON.stringify(snapshot)).digest('hex');
