import { Router } from 'express';
import type { Context } from '../../context.ts';

export function jobRoutes(_context: Context): Router {
  return Router();
}
