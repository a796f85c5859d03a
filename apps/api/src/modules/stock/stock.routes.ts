import { Router } from 'express';
import type { Context } from '../../context.ts';

export function stockRoutes(_context: Context): Router {
  return Router();
}
