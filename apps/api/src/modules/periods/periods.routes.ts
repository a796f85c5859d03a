import { Router } from 'express';
import type { Context } from '../../context.ts';

export function periodRoutes(_context: Context): Router {
  return Router();
}
