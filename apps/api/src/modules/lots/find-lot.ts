import { notFound } from '../../http/problem.ts';
import type { Work } from '../../work.ts';
import { Lot } from './lot.entity.ts';

/** @throws {Problem} 404 */
export async function findLot(em: Work['em'], id: number): Promise<Lot> {
  const lot = await em.findOne(Lot, id);
  if (lot === null) throw notFound('lot');
  return lot;
}
