import { Router } from 'express';
import { printLabels } from '@hidewright/contract';
import type { Context } from '../../context.ts';
import { invalid } from '../../http/problem.ts';
import { serveFile } from '../../http/serve.ts';
import { Workshop } from '../workshop/workshop.entity.ts';
import { readLabels } from './read-labels.ts';

export function labelRoutes(context: Context): Router {
  const router = Router();

  serveFile(router, context, printLabels, async ({ em, today }, { query }) => {
    const { lots, hardware, start, ...grid } = query;
    const { publicUrl } = context.config;
    const labels = await readLabels(em, { lots, hardware, publicUrl });
    if (labels.length === 0)
      throw invalid([{ field: 'lots', message: 'Choose at least one lot or bin to tag.' }]);
    const { name: shopName } = await em.findOneOrFail(Workshop, 1);
    const bytes = await context.papers.labels({ shopName, day: today, grid, start, labels });
    return { name: `tags-${today}.pdf`, type: 'application/pdf', bytes };
  });

  return router;
}
