import { Decimal } from 'decimal.js';
import { invalid } from '../http/problem.ts';
import { logDeed } from '../modules/activity/activity-log.ts';
import { enqueueMail } from '../modules/mail/outbox.ts';
import { ClaimedLot } from '../modules/supplier-claims/claimed-lot.entity.ts';
import { SupplierClaim } from '../modules/supplier-claims/supplier-claim.entity.ts';
import type { Work } from '../work.ts';
import { draftClaim } from './draft-claim.ts';

interface Asked {
  receiptId: number;
  by: 'mail' | 'hand';
  text: string;
  mailIsSet: boolean;
}

/**
 * Claims what is short in a delivery, by a mail in the outbox or in the owner's own way; no lot is claimed twice.
 * @throws {Problem} 409 when there is nothing to claim, 422 when it cannot go by e-mail
 */
export async function openClaim(work: Work, asked: Asked): Promise<number> {
  const draft = await draftClaim(work, asked.receiptId);
  const { order, lines, supplierEmail, supplierName } = draft;
  if (asked.by === 'mail') requireMail(draft, asked.mailIsSet);
  const claim = work.em.create(SupplierClaim, {
    purchaseOrderId: order.id,
    receiptId: asked.receiptId,
    state: 'open',
    missingAreaMm2: new Decimal(draft.missingAreaMm2),
    worth: new Decimal(draft.worth),
    text: asked.text,
    sentBy: asked.by,
    openedAt: work.now.toISOString(),
  });
  await work.em.flush();
  for (const { id } of lines)
    work.em.create(ClaimedLot, { supplierClaimId: claim.id, receiptLineId: id });
  await work.em.flush();
  if (asked.by === 'mail') {
    await enqueueMail(work, {
      recipient: supplierEmail,
      subject: `Order ${order.number}: leather smaller than marked`,
      body: asked.text,
      attachments: [],
      subjectKind: 'purchase order',
      subjectId: order.id,
    });
  }
  await logDeed(work, {
    action: `claimed leather short of its mark from ${supplierName} on purchase order ${order.number}`,
    subjectKind: 'supplier claim',
    subjectId: claim.id,
    detail: { by: asked.by, lots: draft.lots.map(({ lotTag }) => lotTag), worth: draft.worth },
  });
  return claim.id;
}

function requireMail(
  { supplierEmail, supplierName }: { supplierEmail: string; supplierName: string },
  mailIsSet: boolean,
): void {
  if (mailIsSet && supplierEmail !== '') return;
  const message = mailIsSet
    ? `${supplierName} has no e-mail address. Copy the text and send it yourself.`
    : 'Mail is not set up in this shop. Copy the text and send it yourself.';
  throw invalid([{ field: 'by', message }]);
}
