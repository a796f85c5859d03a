import { Router } from 'express';
import type { Context } from '../../context.ts';

export function todayRoutes(_context: Context): Router {
  return Router();
}
