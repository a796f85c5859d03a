import { Router } from 'express';
import type { Context } from '../../context.ts';

export function orderRoutes(_context: Context): Router {
  return Router();
}
