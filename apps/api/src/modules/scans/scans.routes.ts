import { Router } from 'express';
import { readScan } from '@hidewright/contract';
import type { Context } from '../../context.ts';
import { serve } from '../../http/serve.ts';
import { findScanned } from './find-scanned.ts';

export function scanRoutes(context: Context): Router {
  const router = Router();
  serve(router, context, readScan, ({ em }, { params }) => findScanned(em, params.code));
  return router;
}
