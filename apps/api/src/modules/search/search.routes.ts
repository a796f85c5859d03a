import { Router } from 'express';
import type { Context } from '../../context.ts';

export function searchRoutes(_context: Context): Router {
  return Router();
}
