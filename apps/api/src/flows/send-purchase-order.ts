import { invalid, wrongState } from '../http/problem.ts';
import { logDeed } from '../modules/activity/activity-log.ts';
import { noteFile, type KeptFile } from '../modules/files/stored-files.ts';
import { enqueueMail } from '../modules/mail/outbox.ts';
import { findPurchaseOrder } from '../modules/purchase-orders/draft-purchase-order.ts';
import { purchaseOrderLetter } from '../modules/purchase-orders/purchase-order-letter.ts';
import type { PurchaseOrder } from '../modules/purchase-orders/purchase-order.entity.ts';
import { readOnePurchaseOrder } from '../modules/purchase-orders/read-purchase-orders.ts';
import { Supplier } from '../modules/suppliers/supplier.entity.ts';
import { Workshop } from '../modules/workshop/workshop.entity.ts';
import type { Work } from '../work.ts';
import type { PurchaseOrderOnPaper } from './put-purchase-order-on-paper.ts';
import { sendLotsOut } from './services/send-lots-out.ts';

/**
 * Sends a draft to its supplier, by e-mail with its paper or in the owner's own way; from now on it is awaited on the
 * day that its paper names, and the file that was sent stays. The lots that it has worked on go out with it.
 * @throws {Problem} 409 when it is no draft, or less of such a lot is free, 422 when it cannot go by e-mail
 */
export async function sendPurchaseOrder(
  work: Work,
  asked: { id: number; by: 'mail' | 'hand'; mailIsSet: boolean },
  drawn: PurchaseOrderOnPaper,
): Promise<void> {
  const order = await findPurchaseOrder(work, asked.id);
  if (order.state !== 'draft') throw notADraft(order);
  requireSame(order, drawn);
  const supplier = await work.em.findOneOrFail(Supplier, order.supplierId);
  if (asked.by === 'mail') requireMail(supplier, asked.mailIsSet);
  await noteFile(work, drawn.file);
  order.state = 'sent';
  order.paperHash = drawn.file.hash;
  order.sentAt = work.now.toISOString();
  const moved = movedDay(order, drawn);
  order.expectedOn = drawn.expectedOn;
  await work.em.flush();
  await sendLotsOut(work, order);
  if (asked.by === 'mail') await mail(work, order, { supplier, file: drawn.file });
  await logDeed(work, {
    action: `sent purchase order ${order.number} to ${supplier.name} ${asked.by === 'mail' ? 'by e-mail' : 'by hand'}${moved}`,
    subjectKind: 'purchase order',
    subjectId: order.id,
    detail: { from: 'draft', to: 'sent', by: asked.by, expectedOn: order.expectedOn },
  });
}

function notADraft(order: PurchaseOrder) {
  const open = order.state === 'sent' || order.state === 'part received';
  return wrongState(
    `${order.number} is ${order.state} already; only a draft can be sent.`,
    open ? ['receive'] : [],
  );
}

/** A day that was over when the paper was drawn is not what its supplier was told. */
function movedDay({ expectedOn: from }: PurchaseOrder, { expectedOn: to }: PurchaseOrderOnPaper) {
  return from === null || from === to ? '' : `, awaited ${to ?? 'some day'}, as ${from} is over`;
}

function requireMail(supplier: Supplier, mailIsSet: boolean): void {
  if (!mailIsSet) {
    throw invalid([
      { field: 'by', message: 'Mail is not set up in this shop. Hand the order over yourself.' },
    ]);
  }
  if (supplier.email !== '') return;
  const message = `${supplier.name} has no e-mail address. Add one to the supplier, or hand the order over yourself.`;
  throw invalid([{ field: 'by', message }]);
}

function requireSame(order: PurchaseOrder, drawn: PurchaseOrderOnPaper): void {
  if (order.version === drawn.version) return;
  throw wrongState(
    `${order.number} was changed while its paper was drawn. Look at it again, then send it.`,
    ['send'],
  );
}

async function mail(
  work: Work,
  order: PurchaseOrder,
  { supplier, file }: { supplier: Supplier; file: KeptFile },
): Promise<void> {
  const { name, hash, type } = file;
  const workshop = await work.em.findOneOrFail(Workshop, 1);
  await enqueueMail(work, {
    recipient: supplier.email,
    ...purchaseOrderLetter(await readOnePurchaseOrder(work, order.id), workshop),
    attachments: [{ name, hash, type }],
    subjectKind: 'purchase order',
    subjectId: order.id,
  });
}
