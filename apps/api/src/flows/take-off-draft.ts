import { notFound, wrongState } from '../http/problem.ts';
import { logDeed } from '../modules/activity/activity-log.ts';
import { InvoiceLine } from '../modules/invoices/invoice-line.entity.ts';
import type { Invoice } from '../modules/invoices/invoice.entity.ts';
import { nextVersion } from '../modules/invoices/next-version.ts';
import { sumUp } from '../modules/invoices/sum-up.ts';
import { whoseDraft } from '../modules/invoices/whose-draft.ts';
import type { Work } from '../work.ts';
import { putBackSold } from './put-back-sold.ts';

/**
 * Takes one line that was sold from the shelf off a draft; its pieces lie there again.
 * @throws {Problem} 404 without such a line; 409 for the only line, or on the invoice of an order
 */
export async function takeOffDraft(work: Work, invoice: Invoice, position: number): Promise<void> {
  if (invoice.orderId !== null) {
    throw wrongState('The lines of an order’s invoice are what was agreed, and stay.', [
      'change their wording or tax',
      'discard the draft',
    ]);
  }
  const lines = await linesOf(work, invoice);
  const line = lines.find((each) => each.position === position);
  if (line === undefined) throw notFound('line');
  if (lines.length === 1) {
    throw wrongState('This is the only line. Discard the draft instead.', ['discard the draft']);
  }
  const whose = await whoseDraft(work, invoice);
  await putBackSold(work, [line], `taken off the draft invoice for ${whose}`);
  const { description } = line;
  await work.em.removeAndFlush(line);
  await closeGap(work, invoice);
  await sumUp(work, invoice);
  await nextVersion(work, invoice);
  await logDeed(work, {
    action: `took ${description} off the draft invoice for ${whose}`,
    subjectKind: 'invoice',
    subjectId: invoice.id,
  });
}

const linesOf = ({ em }: Work, { id }: Invoice) =>
  em.find(InvoiceLine, { invoiceId: id }, { orderBy: { position: 'asc' } });

/** One after the other, since no two lines may have one position even for a moment. */
async function closeGap(work: Work, invoice: Invoice): Promise<void> {
  for (const [at, line] of (await linesOf(work, invoice)).entries()) {
    line.position = at + 1;
    await work.em.flush();
  }
}
