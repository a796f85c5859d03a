import { Router } from 'express';
import {
  readLearned as readLearnedEndpoint,
  takeLearned as takeLearnedEndpoint,
} from '@hidewright/contract';
import type { Context } from '../../context.ts';
import { readLearned } from '../../flows/learn/read-learned.ts';
import { takeLearned } from '../../flows/learn/take-learned.ts';
import { serve } from '../../http/serve.ts';
import { layoutFor, type WorkedLayout } from '../layouts/stored-layouts.ts';
import { definitionOf, findPattern, latestVersion } from './pattern-versions.ts';

/** What the last runs of a pattern say, and making it the next estimate. */
export function learnedRoutes(context: Context): Router {
  const router = Router();

  serve(router, context, readLearnedEndpoint, (work, { params, query }) =>
    readLearned(work, params.id, query),
  );

  serve(
    router,
    context,
    takeLearnedEndpoint,
    (work, { params, body, ifMatch }, worked: WorkedLayout) =>
      takeLearned(work, { ...body, id: params.id, ifMatch }, worked),
    async ({ params }) => {
      const reader = { em: context.orm.em.fork() };
      const version = await latestVersion(reader, await findPattern(reader, params.id));
      return layoutFor(context, definitionOf(version));
    },
  );

  return router;
}
