import { invalid } from '../../http/problem.ts';
import { Customer } from '../../modules/customers/customer.entity.ts';
import { enqueueMail } from '../../modules/mail/outbox.ts';
import type { Letter, LetterAbout } from '../../modules/orders/order-letters.ts';
import type { Order } from '../../modules/orders/order.entity.ts';
import { Workshop } from '../../modules/workshop/workshop.entity.ts';
import type { Work } from '../../work.ts';

/** Whether, and with what, the customer is told. */
export interface Telling {
  tellCustomer: boolean;
  word: string;
  /** Whether a mail server is set. */
  mailAvailable: boolean;
}

/** Why a customer cannot be told by mail, and what to do instead; null where they can. */
export function whyNotTold(
  customer: { name: string; email: string },
  mailAvailable: boolean,
): string | null {
  if (!mailAvailable) return 'No mail server is set, so tell the customer yourself.';
  if (customer.email !== '') return null;
  return `${customer.name} has no e-mail address. Enter one with the customer, or tell them yourself.`;
}

/**
 * Puts a letter about an order into the outbox, where that was wanted.
 * @throws {Problem} 422 when it cannot go by mail
 */
export async function tellCustomer(
  work: Work,
  order: Order,
  { tellCustomer: wanted, word, mailAvailable }: Telling,
  write: (about: LetterAbout) => Letter,
): Promise<void> {
  if (!wanted) return;
  const customer = await work.em.findOneOrFail(Customer, order.customerId);
  const message = whyNotTold(customer, mailAvailable);
  if (message !== null) throw invalid([{ field: 'tellCustomer', message }]);
  const shop = await work.em.findOneOrFail(Workshop, 1);
  await enqueueMail(work, {
    recipient: customer.email,
    ...write({ order, addressee: customer.contactName || customer.name, shop, word }),
    attachments: [],
    subjectKind: 'order',
    subjectId: order.id,
  });
}
