import type { RunCheck } from '@hidewright/contract';
import { notFound } from '../http/problem.ts';
import { Quote } from '../modules/quotes/quote.entity.ts';
import type { Work } from '../work.ts';
import { checkPlanned } from './check/checked-runs.ts';
import { runReply, sayFor } from './check/run-reply.ts';
import { planQuoted } from './check/runs-asked.ts';

interface Asked {
  quoteId: number;
  /** What was agreed, or else the least that is offered. */
  quantity: number | undefined;
  /** What was agreed, or else the piece as it is. */
  option: string | undefined;
  /** The day in hands, or else two working weeks from today. */
  by: string | undefined;
}

/**
 * Can we make it? For a quote in any state.
 * @throws {Problem} 404, 422 for a day that is over or too far off
 */
export async function checkQuotedRun(work: Work, asked: Asked): Promise<RunCheck> {
  const quote = await work.em.findOne(Quote, asked.quoteId);
  if (quote === null) throw notFound('quote');
  const { runs } = await checkPlanned(work, [await planQuoted(work, quote, asked)]);
  const [checked] = runs;
  if (checked === undefined) throw new TypeError('One run has one answer');
  return runReply(checked, await sayFor(work.em));
}
