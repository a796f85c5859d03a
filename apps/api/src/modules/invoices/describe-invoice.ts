import type { Invoice as InvoiceReply } from '@hidewright/contract';
import { notFound } from '../../http/problem.ts';
import type { InvoiceSnapshot } from '../../papers/invoice-pdf.ts';
import type { Work } from '../../work.ts';
import { Order } from '../orders/order.entity.ts';
import type { Invoice } from './invoice.entity.ts';
import { readSummary } from './invoice.repository.ts';
import { InvoiceLine } from './invoice-line.entity.ts';
import { listPaymentsOf } from './payments.repository.ts';
import { wordingOf, type Wording } from './snapshot.ts';

/** An invoice as it is read: an issued one in the words it was issued with, a draft as it would be issued now. */
export async function describeInvoice(work: Work, invoice: Invoice): Promise<InvoiceReply> {
  const { em } = work;
  const summary = await readSummary(em, work.today, invoice.id);
  if (summary === undefined) throw notFound('invoice');
  const order = await em.findOneOrFail(Order, invoice.orderId);
  const words: Wording = issuedWords(invoice) ?? (await wordingOf(work, invoice));
  const rates = await rateIds(em, invoice.id);
  return {
    ...summary,
    orderState: order.state,
    currency: words.currency,
    billedTo: words.billedTo,
    lines: words.lines.map((line) => ({ ...line, taxRateId: rates.get(line.position) ?? null })),
    taxes: words.taxes,
    payments: await listPaymentsOf(em, invoice.id),
    snapshotHash: invoice.snapshotHash,
  };
}

export function issuedWords(invoice: Invoice): InvoiceSnapshot | null {
  return invoice.snapshot as InvoiceSnapshot | null;
}

async function rateIds(em: Work['em'], invoiceId: number): Promise<Map<number, number | null>> {
  const lines = await em.find(InvoiceLine, { invoiceId });
  return new Map(lines.map((line) => [line.position, line.taxRateId]));
}
