import { Router } from 'express';
import {
  addToCount as addEndpoint,
  approveCount as approveEndpoint,
  cancelCount as cancelEndpoint,
  countAgain as againEndpoint,
  enterCount as enterEndpoint,
  handInCount as handInEndpoint,
  listCountPlaces,
  listCounts,
  openCount as openEndpoint,
  readCount,
} from '@hidewright/contract';
import type { Context } from '../../context.ts';
import { approveCount } from '../../flows/approve-count.ts';
import { describeCount, describeCountLine } from '../../flows/describe-count.ts';
import { addToCount, enterCount } from '../../flows/enter-count.ts';
import { cancelCount, countAgain, handInCount } from '../../flows/hand-in-count.ts';
import { openCount } from '../../flows/open-count.ts';
import { readCursor, toPage } from '../../http/paging.ts';
import { serve } from '../../http/serve.ts';
import { readCountCards, readPlaces } from './read-counts.ts';

export function countRoutes(context: Context): Router {
  const router = Router();

  serve(router, context, listCounts, async ({ em }, { query: { cursor, limit } }) => {
    const rows = await readCountCards(em, { below: readCursor(cursor), limit: limit + 1 });
    return toPage(rows, limit, (row) => row.id);
  });

  serve(router, context, listCountPlaces, async ({ em }) => ({ items: await readPlaces(em) }));

  serve(router, context, openEndpoint, async (work, { body }) =>
    describeCount(work, await openCount(work, body)),
  );

  serve(router, context, readCount, (work, { params }) => describeCount(work, params.id));

  serve(router, context, enterEndpoint, async (work, { params, body }) => {
    const replaced = await enterCount(work, params, body);
    return { line: await describeCountLine(work, params.id, params.lineId), replaced };
  });

  serve(router, context, addEndpoint, async (work, { params, body }) => {
    const { lineId, already } = await addToCount(work, params.id, body.code);
    return { line: await describeCountLine(work, params.id, lineId), already };
  });

  serve(router, context, handInEndpoint, async (work, { params, body }) => {
    await handInCount(work, params.id, body.leaveUncounted);
    return describeCount(work, params.id);
  });

  serve(router, context, againEndpoint, async (work, { params, body }) => {
    await countAgain(work, params.id, body.lineIds);
    return describeCount(work, params.id);
  });

  serve(router, context, approveEndpoint, async (work, { params, ifMatch }) => {
    await approveCount(work, { id: params.id, ifMatch });
    return describeCount(work, params.id);
  });

  serve(router, context, cancelEndpoint, async (work, { params }) => {
    await cancelCount(work, params.id);
    return describeCount(work, params.id);
  });

  return router;
}
