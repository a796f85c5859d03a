import { Decimal } from 'decimal.js';
import type { Work } from '../../work.ts';
import { Invoice } from './invoice.entity.ts';

/** A draft without lines yet; without an order where the pieces are sold from the shelf. */
export async function startDraft(
  work: Work,
  of: { orderId: number | null; customerId: number },
): Promise<Invoice> {
  const nought = new Decimal(0);
  const invoice = work.em.create(Invoice, {
    ...of,
    state: 'draft',
    net: nought,
    tax: nought,
    total: nought,
    paid: nought,
    credited: nought,
    createdAt: work.now.toISOString(),
  });
  await work.em.flush();
  return invoice;
}
