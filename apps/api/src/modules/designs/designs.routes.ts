import { Router } from 'express';
import { dropDesign, listDesigns } from '@hidewright/contract';
import type { Context } from '../../context.ts';
import { notFound } from '../../http/problem.ts';
import { readCursor, toPage } from '../../http/paging.ts';
import { serve } from '../../http/serve.ts';
import { logDeed } from '../activity/activity-log.ts';
import { Design } from './design.entity.ts';
import { describeDesign } from './read-designs.ts';

export function designRoutes(context: Context): Router {
  const router = Router();

  serve(router, context, listDesigns, async ({ em }, { query }) => {
    const { limit, customerId, patternId } = query;
    const before = readCursor(query.cursor);
    const rows = await em.find(
      Design,
      {
        ...(customerId !== undefined && { customerId }),
        ...(patternId !== undefined && { patternId }),
        ...(before !== undefined && { id: { $lt: before } }),
      },
      { orderBy: { id: 'desc' }, limit: limit + 1 },
    );
    const { items, next } = toPage(rows, limit, ({ id }) => id);
    const described = [];
    for (const design of items) described.push(await describeDesign(em, design));
    return { items: described, next };
  });

  serve(router, context, dropDesign, async (work, { params }) => {
    const design = await work.em.findOne(Design, params.id);
    if (design === null) throw notFound('design');
    const { customerName, patternName } = await describeDesign(work.em, design);
    await logDeed(work, {
      action: `let quotes of ${patternName} for ${customerName} go by the pattern again`,
      subjectKind: 'design',
      subjectId: design.id,
    });
    await work.em.remove(design).flush();
    return { dropped: true as const };
  });

  return router;
}
