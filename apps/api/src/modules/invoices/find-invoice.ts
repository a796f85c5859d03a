import type { EntityManager } from '@mikro-orm/sqlite';
import { notFound, wrongState } from '../../http/problem.ts';
import { Invoice } from './invoice.entity.ts';

/** @throws {Problem} 404 */
export async function findInvoice(em: EntityManager, id: number): Promise<Invoice> {
  const invoice = await em.findOne(Invoice, id);
  if (invoice === null) throw notFound('invoice');
  return invoice;
}

/** @throws {Problem} 404, or 409 when it was issued already */
export async function findDraft(em: EntityManager, id: number): Promise<Invoice> {
  const invoice = await findInvoice(em, id);
  if (invoice.state === 'draft') return invoice;
  const allowed = invoice.state === 'paid' ? ['download it'] : ['record a payment', 'download it'];
  throw wrongState(
    `This invoice was issued as ${String(invoice.number)}, and an issued invoice does not change.`,
    allowed,
  );
}
