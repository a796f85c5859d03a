import { Router } from 'express';
import { search, type Found } from '@hidewright/contract';
import type { Context } from '../../context.ts';
import { serve } from '../../http/serve.ts';
import { sourcesFor } from './sources.ts';

export function searchRoutes(context: Context): Router {
  const router = Router();

  serve(router, context, search, async ({ em, actor }, { query }) => {
    const pattern = `%${query.q.replaceAll(/[\\%_]/g, '\\$&')}%`;
    const items: Found[] = [];
    for (const { kind, sql, to } of sourcesFor(actor.role)) {
      const rows = await em.execute<{ key: string; label: string; detail: string }[]>(sql, [
        pattern,
        pattern,
      ]);
      items.push(
        ...rows.map((row) => ({ kind, label: row.label, detail: row.detail, to: to(row.key) })),
      );
    }
    return { items };
  });

  return router;
}
