import { notFound } from '../../http/problem.ts';
import type { Work } from '../../work.ts';
import { Receipt } from './receipt.entity.ts';

/** @throws {Problem} 404 */
export async function findReceipt(em: Work['em'], id: number): Promise<Receipt> {
  const receipt = await em.findOne(Receipt, id);
  if (receipt === null) throw notFound('delivery');
  return receipt;
}
