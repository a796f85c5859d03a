import type { QuoteBody } from '@hidewright/contract';
import type { Quote } from '../modules/quotes/quote.entity.ts';
import type { Work } from '../work.ts';
import type { LaidPattern } from './lay-pattern.ts';

/**
 * Drafts a quote: draws its number, keeps the layout, takes the snapshot and prices it.
 * @param laid the pattern's latest version with its layout: `await layPattern(context, asked.patternId)`, before the transaction
 * @throws {Problem} 422 when the customer does not exist or the run cannot be priced
 */
export async function createQuote(work: Work, asked: QuoteBody, laid: LaidPattern): Promise<Quote> {
  throw new Error(`${work.today} ${asked.title} ${laid.patternId}`);
}
