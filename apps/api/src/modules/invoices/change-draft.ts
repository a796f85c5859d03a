import { Decimal } from 'decimal.js';
import type { BodyOf, changeInvoice } from '@hidewright/contract';
import { invalid } from '../../http/problem.ts';
import type { Work } from '../../work.ts';
import { logDeed } from '../activity/activity-log.ts';
import { chosenTaxRate } from '../tax-rates/find-tax-rate.ts';
import type { Invoice } from './invoice.entity.ts';
import { InvoiceLine } from './invoice-line.entity.ts';
import { nextVersion } from './next-version.ts';
import { sumUp } from './sum-up.ts';
import { whoseDraft } from './whose-draft.ts';

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
    action: `changed the draft invoice for ${await whoseDraft(work, invoice)}`,
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
