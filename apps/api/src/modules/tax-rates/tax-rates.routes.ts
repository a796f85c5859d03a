import { Router } from 'express';
import type { Context } from '../../context.ts';

export function taxRateRoutes(_context: Context): Router {
  return Router();
}
