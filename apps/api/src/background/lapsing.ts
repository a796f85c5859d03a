import type { Context } from '../context.ts';
import { lapseQuotes } from '../flows/lapse-quotes.ts';
import { inTransaction, theProgram } from '../work.ts';
import { repeat, type Repeating } from './repeat.ts';

/** Lets quotes lapse once their last day is over. */
export function startLapsing(context: Context): Repeating {
  return repeat('lapsing', 10 * 60_000, context.log, async () => {
    await inTransaction(context, theProgram, lapseQuotes);
  });
}
