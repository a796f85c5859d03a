import { addDays } from '@hidewright/domain';
import { drawPaperNumber } from '../db/counters.ts';
import { logDeed } from '../modules/activity/activity-log.ts';
import { findDraft } from '../modules/invoices/find-invoice.ts';
import type { Invoice } from '../modules/invoices/invoice.entity.ts';
import { snapshotHash, wordingOf } from '../modules/invoices/snapshot.ts';
import { postEntry } from '../modules/periods/ledger.ts';
import { requireOpenDay } from '../modules/periods/open-days.ts';
import { Workshop } from '../modules/workshop/workshop.entity.ts';
import type { Work } from '../work.ts';

interface Asked {
  invoiceId: number;
  issuedOn: string;
}

/**
 * Issues a draft: it takes the next number, is kept word for word with its hash, and is posted.
 * @throws {Problem} 409 when it was issued already or the day is locked, 422 when the day is still to come
 */
export async function issueInvoice(work: Work, { invoiceId, issuedOn }: Asked): Promise<Invoice> {
  const invoice = await findDraft(work.em, invoiceId);
  await requireOpenDay(work, issuedOn, 'issuedOn');
  const workshop = await work.em.findOneOrFail(Workshop, 1);
  const dueOn = addDays(issuedOn, workshop.paymentTermDays);
  const number = await drawPaperNumber(work.em, 'I');
  const snapshot = { number, issuedOn, dueOn, ...(await wordingOf(work, invoice)) };
  work.em.assign(invoice, {
    number,
    sequence: Number(number.slice('I-'.length)),
    state: 'issued',
    issuedOn,
    dueOn,
    snapshot,
    snapshotHash: snapshotHash(snapshot),
  });
  await work.em.flush();
  await post(work, invoice, issuedOn);
  await logDeed(work, {
    action: `issued invoice ${number}`,
    subjectKind: 'invoice',
    subjectId: invoice.id,
    detail: { total: snapshot.total, issuedOn, snapshotHash: invoice.snapshotHash },
  });
  return invoice;
}

async function post(work: Work, invoice: Invoice, day: string): Promise<void> {
  await postEntry(work, {
    day,
    invoiceId: invoice.id,
    paymentId: null,
    sides: [
      ['receivables', invoice.total],
      ['sales', invoice.net.negated()],
      ['tax', invoice.tax.negated()],
    ],
  });
}
