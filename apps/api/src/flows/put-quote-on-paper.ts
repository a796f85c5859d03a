import type { Context } from '../context.ts';
import { notFound } from '../http/problem.ts';
import type { KeptFile } from '../modules/files/stored-files.ts';
import { Quote } from '../modules/quotes/quote.entity.ts';
import { paperOf } from '../modules/quotes/quote-paper.ts';
import type { QuotePaper } from '../papers/quote-pdf.ts';
import { reading, type Actor } from '../work.ts';

/** A quote's paper, drawn and kept, and the version of the quote that it shows. */
export interface QuoteOnPaper {
  version: number;
  paper: QuotePaper;
  file: KeptFile;
}

/**
 * Draws a quote as it is now and keeps the file: before the transaction that sends it.
 * @throws {Problem} 404
 */
export async function putQuoteOnPaper(
  context: Context,
  actor: Actor,
  quoteId: number,
): Promise<QuoteOnPaper> {
  const { version, paper } = await reading(context, actor, async (work) => {
    const quote = await work.em.findOne(Quote, quoteId);
    if (quote === null) throw notFound('quote');
    return { version: quote.version, paper: await paperOf(work, quote) };
  });
  const bytes = await context.papers.quote(paper);
  const hash = await context.files.keep(bytes);
  const name = `${paper.number.replace(', revision ', '-')}.pdf`;
  return { version, paper, file: { hash, name, type: 'application/pdf', size: bytes.byteLength } };
}
