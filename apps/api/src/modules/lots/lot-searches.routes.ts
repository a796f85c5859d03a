import { Router } from 'express';
import {
  readLotSearch,
  startLotSearch,
  stopLotSearch,
  type LotLayout,
  type LotSearch,
} from '@hidewright/contract';
import type { Context } from '../../context.ts';
import { searchOnLot, searchReply } from '../../flows/search-on-lot.ts';
import { Problem } from '../../http/problem.ts';
import { serve } from '../../http/serve.ts';
import type { Search } from '../../workers/searches.ts';

export function lotSearchRoutes(context: Context): Router {
  const router = Router();
  const { searches } = context;

  serve(
    router,
    context,
    startLotSearch,
    async (_work, _asked, search: Search<LotLayout>) => searchReply(search),
    ({ params, body }) => searchOnLot(context, params.id, body.patternId),
  );

  serve(router, context, readLotSearch, async (_work, { params }) =>
    replyFor(searches.find(params.id)),
  );

  serve(
    router,
    context,
    stopLotSearch,
    async (_work, _asked, search: Search<LotLayout> | undefined) => replyFor(search),
    ({ params }) => searches.stop(params.id),
  );

  return router;
}

/** @throws {Problem} 404 */
function replyFor(search: Search<LotLayout> | undefined): LotSearch {
  if (search !== undefined) return searchReply(search);
  throw new Problem(
    404,
    'Not found',
    'This search is not kept any more. Start it again; what came to its end is found at once.',
  );
}
