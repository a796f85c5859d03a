import type {
  Invoice as InvoiceReply,
  InvoiceLine as InvoiceLineReply,
} from '@hidewright/contract';
import { notFound } from '../../http/problem.ts';
import type { InvoiceSnapshot } from '../../papers/invoice-pdf.ts';
import type { Work } from '../../work.ts';
import { ShelfSale } from '../finished-pieces/shelf-sale.entity.ts';
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
  const order = invoice.orderId === null ? null : await em.findOneOrFail(Order, invoice.orderId);
  const words: Wording = issuedWords(invoice) ?? (await wordingOf(work, invoice));
  const behind = await behindLines(em, invoice.id);
  return {
    ...summary,
    orderState: order?.state ?? null,
    currency: words.currency,
    billedTo: words.billedTo,
    lines: words.lines.map((line) => ({ ...line, ...(behind.get(line.position) ?? nothing) })),
    taxes: words.taxes,
    payments: await listPaymentsOf(em, invoice.id),
    snapshotHash: invoice.snapshotHash,
  };
}

export function issuedWords(invoice: Invoice): InvoiceSnapshot | null {
  return invoice.snapshot as InvoiceSnapshot | null;
}

type Behind = Pick<InvoiceLineReply, 'taxRateId' | 'finishedPieceId'>;
const nothing: Behind = { taxRateId: null, finishedPieceId: null };

/** What the words of each line stand for: the tax rate, and the pieces that it sells from the shelf. */
async function behindLines(em: Work['em'], invoiceId: number): Promise<Map<number, Behind>> {
  const lines = await em.find(InvoiceLine, { invoiceId });
  const sales = await em.find(ShelfSale, { invoiceLineId: { $in: lines.map(({ id }) => id) } });
  const soldBy = new Map(sales.map((sale) => [sale.invoiceLineId, sale.finishedPieceId]));
  return new Map(
    lines.map(({ id, position, taxRateId }) => [
      position,
      { taxRateId, finishedPieceId: soldBy.get(id) ?? null },
    ]),
  );
}
