import { Router } from 'express';
import { readLayout, workOutLayout } from '@hidewright/contract';
import type { Context } from '../../context.ts';
import { serve } from '../../http/serve.ts';
import {
  findLayout,
  keepLayout,
  layoutFor,
  layoutReply,
  type WorkedLayout,
} from './stored-layouts.ts';

export function layoutRoutes(context: Context): Router {
  const router = Router();

  serve(
    router,
    context,
    workOutLayout,
    async (work, _asked, worked: WorkedLayout) => layoutReply(await keepLayout(work, worked)),
    ({ body }) => layoutFor(context, body),
  );

  serve(router, context, readLayout, async ({ em }, { params }) =>
    layoutReply(await findLayout(em, params.id)),
  );

  return router;
}
