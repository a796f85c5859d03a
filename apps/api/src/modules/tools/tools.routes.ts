import { Router } from 'express';
import {
  addImpressions as addImpressionsEndpoint,
  addTool as addToolEndpoint,
  changeTool as changeToolEndpoint,
  giveBackTool,
  listImpressions as listImpressionsEndpoint,
  listTools as listToolsEndpoint,
  readTool,
  scrapTool,
} from '@hidewright/contract';
import type { Context } from '../../context.ts';
import { endTool } from '../../flows/end-tool.ts';
import { addTool, changeTool } from '../../flows/save-tool.ts';
import { readCursor, toPage } from '../../http/paging.ts';
import { serve } from '../../http/serve.ts';
import { logDeed } from '../activity/activity-log.ts';
import { describeTool, describeTools } from './describe-tool.ts';
import { findTool } from './find-tool.ts';
import { addImpressions } from './tool-ledger.ts';
import { describeImpressions, listImpressions, listTools } from './tools.repository.ts';

export function toolRoutes(context: Context): Router {
  const router = Router();

  serve(router, context, listToolsEndpoint, async (work, { query }) => {
    const { cursor, q, kind, state, patternId, limit } = query;
    const rows = await listTools(work, {
      below: readCursor(cursor),
      q,
      kind,
      state,
      patternId,
      limit,
    });
    const { items, next } = toPage(rows, limit, (row) => row.id);
    return { items: await describeTools(work, items), next };
  });

  serve(router, context, readTool, async (work, { params }) =>
    describeTool(work, await findTool(work, params.id)),
  );

  serve(router, context, addToolEndpoint, async (work, { body }) =>
    describeTool(work, await addTool(work, body)),
  );

  serve(router, context, changeToolEndpoint, async (work, { params, body, ifMatch }) =>
    describeTool(work, await changeTool(work, { id: params.id, ifMatch, change: body })),
  );

  serve(router, context, giveBackTool, async (work, { params }) =>
    describeTool(work, await endTool(work, params.id, 'returned')),
  );

  serve(router, context, scrapTool, async (work, { params }) =>
    describeTool(work, await endTool(work, params.id, 'scrapped')),
  );

  serve(router, context, listImpressionsEndpoint, async (work, { params, query }) => {
    const { id } = await findTool(work, params.id);
    const rows = await listImpressions(work, {
      toolId: id,
      below: readCursor(query.cursor),
      limit: query.limit,
    });
    const { items, next } = toPage(rows, query.limit, (row) => row.id);
    return { items: await describeImpressions(work, items), next };
  });

  serve(router, context, addImpressionsEndpoint, async (work, { params, body }) => {
    const tool = await addImpressions(work, { toolId: params.id, jobId: null, ...body });
    await logDeed(work, {
      action: `counted ${body.uses} on ${tool.kind} ${tool.number}`,
      subjectKind: 'tool',
      subjectId: tool.id,
      detail: body,
    });
    return describeTool(work, tool);
  });

  return router;
}
