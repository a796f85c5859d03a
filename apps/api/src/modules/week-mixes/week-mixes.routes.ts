import { Router } from 'express';
import { startWeekMix, workOutWeekMix, type WeekMixReply } from '@hidewright/contract';
import { weekMix } from '@hidewright/domain';
import type { Context } from '../../context.ts';
import { weekToStartWith } from '../../flows/start-week-mix.ts';
import { serve } from '../../http/serve.ts';
import { linearSolver } from './solver.ts';

export function weekMixRoutes(context: Context): Router {
  const router = Router();

  serve(router, context, startWeekMix, weekToStartWith);

  serve(
    router,
    context,
    workOutWeekMix,
    (_work, _asked, mix: WeekMixReply) => Promise.resolve(mix),
    async ({ body }) => weekMix(body, await linearSolver()),
  );

  return router;
}
