import type { Work } from '../../work.ts';
import type { Invoice } from './invoice.entity.ts';

/** Its lines are part of it: whoever read it before they changed has read an older version. */
export async function nextVersion({ em }: Work, invoice: Invoice): Promise<void> {
  await em.execute('UPDATE invoice SET version = version + 1 WHERE id = ?', [invoice.id]);
  await em.refresh(invoice);
}
