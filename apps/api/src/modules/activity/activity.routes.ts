import { Router } from 'express';
import { listActivities } from '@hidewright/contract';
import type { Context } from '../../context.ts';
import { readCursor, toPage } from '../../http/paging.ts';
import { serve } from '../../http/serve.ts';
import { Activity } from './activity.entity.ts';

export function activityRoutes(context: Context): Router {
  const router = Router();

  serve(router, context, listActivities, async ({ em }, { query }) => {
    const below = readCursor(query.cursor) ?? Number.MAX_SAFE_INTEGER;
    const words =
      query.q === undefined
        ? {}
        : {
            $or: [{ action: { $like: `%${query.q}%` } }, { actorName: { $like: `%${query.q}%` } }],
          };
    const rows = await em.find(
      Activity,
      { seq: { $lt: below }, ...words },
      { orderBy: { seq: 'desc' }, limit: query.limit + 1 },
    );
    const { items, next } = toPage(rows, query.limit, (row) => row.seq);
    return {
      items: items.map(({ seq, at, actorName, actorRole, action, subjectKind }) => ({
        seq,
        at,
        actorName,
        actorRole,
        action,
        subjectKind,
      })),
      next,
    };
  });

  return router;
}
