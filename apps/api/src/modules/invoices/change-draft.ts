import { Decimal } from 'decimal.js';
import type { BodyOf, changeInvoice } from '@hidewright/contract';
import { invalid } from '../../http/problem.ts';
import type { Work } from '../../work.ts';
import { logDeed } from '../activity/activity-log.ts';
import { Order } from '../orders/order.entity.ts';
import { chosenTaxRate } from '../tax-rates/find-tax-rate.ts';
import type { Invoice } from './invoice.entity.ts';
import { InvoiceLine } from './invoice-line.entity.ts';
import { InvoiceTax } from './invoice-tax.entity.ts';
import { sumUp } from './sum-up.ts';

type Change = BodyOf<typeof changeInvoice>['lines'][number];

/** Changes what lines of a draft say or which tax they bear; quantities and prices stay as they were agreed. */
export async function changeDraft(work: Work, invoice: Invoice, changes: Change[]): Promise<void> {
  const lines = await work.em.find(InvoiceLine, { invoiceId: invoice.id });
  for (const [at, change] of changes.entries()) {
    const line = lines.find(({ position }) => position === change.position);
    if (line === undefined) {
      throw invalid([{ field: `lines.${at}.position`, message: 'This invoice has no such line.' }]);
    }
    await changeLine(work, line, change, `lines.${at}.taxRateId`);
  }
  await work.em.flush();
  await sumUp(work, invoice);
  await nextVersion(work, invoice);
  await logDeed(work, {
    action: `changed the draft invoice for ${await orderNumber(work, invoice)}`,
    subjectKind: 'invoice',
    subjectId: invoice.id,
  });
}

async function changeLine(
  work: Work,
  line: InvoiceLine,
  change: Change,
  field: string,
): Promise<void> {
  if (change.description !== undefined) line.description = change.description;
  if (change.taxRateId === undefined || change.taxRateId === line.taxRateId) return;
  const rate = await chosenTaxRate(work.em, change.taxRateId, field);
  line.taxRateId = rate?.id ?? null;
  line.taxPercent = rate?.percent ?? new Decimal(0);
}

/** Its lines are part of it: whoever read it before they changed has read an older version. */
async function nextVersion({ em }: Work, invoice: Invoice): Promise<void> {
  await em.execute('UPDATE invoice SET version = version + 1 WHERE id = ?', [invoice.id]);
  await em.refresh(invoice);
}

/** Takes a draft away; its order can be invoiced again. */
export async function discardDraft(work: Work, invoice: Invoice): Promise<void> {
  const order = await orderNumber(work, invoice);
  const invoiceId = invoice.id;
  await work.em.nativeDelete(InvoiceLine, { invoiceId });
  await work.em.nativeDelete(InvoiceTax, { invoiceId });
  await work.em.removeAndFlush(invoice);
  await logDeed(work, {
    action: `discarded the draft invoice for ${order}`,
    subjectKind: 'invoice',
    subjectId: invoiceId,
  });
}

const orderNumber = async ({ em }: Work, invoice: Invoice) =>
  (await em.findOneOrFail(Order, invoice.orderId)).number;
