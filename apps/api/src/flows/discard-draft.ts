import { logDeed } from '../modules/activity/activity-log.ts';
import type { Invoice } from '../modules/invoices/invoice.entity.ts';
import { InvoiceLine } from '../modules/invoices/invoice-line.entity.ts';
import { InvoiceTax } from '../modules/invoices/invoice-tax.entity.ts';
import { whoseDraft } from '../modules/invoices/whose-draft.ts';
import type { Work } from '../work.ts';
import { putBackSold } from './put-back-sold.ts';

/** Takes a draft away; its order can be invoiced again, and what it sold from the shelf lies there again. */
export async function discardDraft(work: Work, invoice: Invoice): Promise<void> {
  const whose = await whoseDraft(work, invoice);
  const invoiceId = invoice.id;
  const lines = await work.em.find(InvoiceLine, { invoiceId });
  await putBackSold(work, lines, `the draft invoice for ${whose} was discarded`);
  await work.em.nativeDelete(InvoiceLine, { invoiceId });
  await work.em.nativeDelete(InvoiceTax, { invoiceId });
  await work.em.removeAndFlush(invoice);
  await logDeed(work, {
    action: `discarded the draft invoice for ${whose}`,
    subjectKind: 'invoice',
    subjectId: invoiceId,
  });
}
