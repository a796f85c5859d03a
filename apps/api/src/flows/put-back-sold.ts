import { putBackFinished } from '../modules/finished-pieces/finished-ledger.ts';
import { ShelfSale } from '../modules/finished-pieces/shelf-sale.entity.ts';
import type { InvoiceLine } from '../modules/invoices/invoice-line.entity.ts';
import type { Work } from '../work.ts';

/** Undoes what lines of a draft sold from the shelf, before those lines go. */
export async function putBackSold(
  work: Work,
  lines: readonly InvoiceLine[],
  reason: string,
): Promise<void> {
  const sold = { invoiceLineId: { $in: lines.map(({ id }) => id) } };
  for (const sale of await work.em.find(ShelfSale, sold, { orderBy: { id: 'asc' } })) {
    sale.invoiceLineId = null;
    sale.undoneAt = work.now.toISOString();
    await work.em.flush();
    await putBackFinished(work, sale.id, reason);
  }
}
