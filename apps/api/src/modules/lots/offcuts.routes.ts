import { Router } from 'express';
import { putOffcutBack as endpoint } from '@hidewright/contract';
import type { Context } from '../../context.ts';
import { putOffcutBack } from '../../flows/put-offcut-back.ts';
import { serve } from '../../http/serve.ts';
import { readOneLot } from './read-lots.ts';

export function offcutRoutes(context: Context): Router {
  const router = Router();

  serve(router, context, endpoint, async (work, { params, body }) => {
    const { id } = await putOffcutBack(work, params.id, body);
    return readOneLot(work.em, id);
  });

  return router;
}
