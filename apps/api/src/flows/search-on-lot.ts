import { NotWorkable } from '@hidewright/domain';
import type { LotLayout, LotSearch } from '@hidewright/contract';
import type { Context } from '../context.ts';
import { Problem } from '../http/problem.ts';
import { keepLayout, sideLayoutFor } from '../modules/layouts/stored-layouts.ts';
import { inTransaction, theProgram } from '../work.ts';
import type { Ending, Search } from '../workers/searches.ts';
import type { SearchWatch } from '../workers/watched.ts';
import { askOfLot, laidOnLotReply, type AskedOfLot } from './lay-on-lot.ts';

/**
 * Looks for the most pieces of a pattern on a lot, and comes back while it looks. What is found at the end is kept
 * like every layout; what was found when somebody stopped it is not, since it need not be the same another time.
 * @throws {Problem} 404, 422 where the lot or the pattern is not drawn, 429 while too many look already
 */
export async function searchOnLot(
  context: Context,
  lotId: number,
  patternId: number,
): Promise<Search<LotLayout>> {
  const { names, input } = await askOfLot(context, lotId, patternId);
  const asked: AskedOfLot = { names, input: { ...input, search: 'best' } };
  const search = context.searches.start(JSON.stringify(asked), (watch) =>
    look(context, asked, watch).catch((error: unknown) => refusalFor(context, error)),
  );
  if (search === undefined) throw tooMany();
  return search;
}

async function look(
  context: Context,
  { names, input }: AskedOfLot,
  watch: SearchWatch,
): Promise<Ending<LotLayout>> {
  let stopped = false;
  const worked = await sideLayoutFor(context, input, async () => {
    const found = await context.workers.searchSide(input, watch);
    stopped = found.stopped;
    return found.side;
  });
  if (!stopped) await inTransaction(context, theProgram, (work) => keepLayout(work, worked));
  return { state: stopped ? 'stopped' : 'done', found: laidOnLotReply({ names, worked }) };
}

function refusalFor({ log }: Context, error: unknown): Ending<LotLayout> {
  if (error instanceof NotWorkable) return { state: 'refused', refusal: error.message };
  log.error({ err: error }, 'a search failed');
  const refusal = 'The search broke off. Start it again; if that stays, look at the log.';
  return { state: 'refused', refusal };
}

const tooMany = () =>
  new Problem(
    429,
    'Enough searches are under way',
    'Others are looking already. Stop one, or try again in a moment.',
    { headers: { 'Retry-After': '5' } },
  );

export function searchReply({ id, progress, ending }: Search<LotLayout>): LotSearch {
  const { state } = ending ?? { state: 'looking' };
  const found = ending !== null && 'found' in ending ? ending.found : null;
  return {
    id,
    state,
    done: state === 'done' ? 1 : progress.done,
    pieces: found?.pieces ?? progress.pieces,
    layout: found,
    refusal: ending !== null && 'refusal' in ending ? ending.refusal : null,
  };
}
