import { Router } from 'express';
import { addTimeReadings as addTimeReadingsEndpoint, listTimeReadings } from '@hidewright/contract';
import type { Context } from '../../context.ts';
import { addTimeReadings, readTimeReadings } from '../../flows/time-steps.ts';
import { serve } from '../../http/serve.ts';

export function timeReadingRoutes(context: Context): Router {
  const router = Router();

  serve(router, context, listTimeReadings, (work, { params }) => readTimeReadings(work, params.id));

  serve(router, context, addTimeReadingsEndpoint, async (work, { params, body }) => {
    await addTimeReadings(work, params.id, body);
    return readTimeReadings(work, params.id);
  });

  return router;
}
