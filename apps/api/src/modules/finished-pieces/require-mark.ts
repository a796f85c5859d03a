import type { EntityManager } from '@mikro-orm/sqlite';
import { invalid } from '../../http/problem.ts';
import { Customer } from '../customers/customer.entity.ts';
import type { FinishedPiece } from './finished-piece.entity.ts';

/**
 * Pieces that bear a customer's mark are sold or given to that customer alone.
 * @throws {Problem} 422 when somebody else has them, or nobody is named
 */
export async function requireMarkOf(
  em: EntityManager,
  { customerId }: FinishedPiece,
  receiverId: number | null,
): Promise<void> {
  if (customerId === null || customerId === receiverId) return;
  const { name } = await em.findOneOrFail(Customer, customerId);
  const message = `These bear the mark of ${name}, and go to nobody else. Choose ${name}.`;
  throw invalid([{ field: 'customerId', message }]);
}
