import { notFound } from '../../http/problem.ts';
import type { Work } from '../../work.ts';
import { Quote } from './quote.entity.ts';

/** @throws {Problem} 404 */
export async function findQuote(work: Pick<Work, 'em'>, id: number): Promise<Quote> {
  const quote = await work.em.findOne(Quote, id);
  if (quote === null) throw notFound('quote');
  return quote;
}
