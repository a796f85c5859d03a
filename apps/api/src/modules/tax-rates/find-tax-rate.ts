import type { EntityManager } from '@mikro-orm/sqlite';
import { invalid } from '../../http/problem.ts';
import { TaxRate } from './tax-rate.entity.ts';

/**
 * The rate that was chosen for a paper; null says that no tax applies.
 * @throws {Problem} 422 when there is no such rate, or it was retired
 */
export async function chosenTaxRate(
  em: EntityManager,
  id: number | null,
  field = 'taxRateId',
): Promise<TaxRate | null> {
  if (id === null) return null;
  const rate = await em.findOne(TaxRate, id);
  if (rate === null) {
    throw invalid([
      { field, message: 'There is no such tax rate. Choose one of the list, or no tax.' },
    ]);
  }
  if (!rate.active) {
    throw invalid([{ field, message: `${rate.name} is retired. Choose another rate, or no tax.` }]);
  }
  return rate;
}
