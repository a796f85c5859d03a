import { Router } from 'express';
import type { Context } from '../../context.ts';

export function patternRoutes(_context: Context): Router {
  return Router();
}
