import { Router } from 'express';
import { readHealth, readOpenApi } from '@hidewright/contract';
import type { Context } from '../../context.ts';
import { openApiDocument } from '../../http/openapi.ts';
import { serve } from '../../http/serve.ts';

export function systemRoutes(context: Context): Router {
  const router = Router();
  let document: ReturnType<typeof openApiDocument> | undefined;

  serve(router, context, readHealth, async ({ em }) => {
    await em.getConnection().execute('SELECT 1');
    return { status: 'ok' as const };
  });

  serve(router, context, readOpenApi, () => Promise.resolve((document ??= openApiDocument())));

  return router;
}
