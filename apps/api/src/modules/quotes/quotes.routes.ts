import { Router } from 'express';
import type { Context } from '../../context.ts';

export function quoteRoutes(_context: Context): Router {
  return Router();
}
