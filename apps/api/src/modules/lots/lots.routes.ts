import { Router } from 'express';
import type { Context } from '../../context.ts';

export function lotRoutes(_context: Context): Router {
  return Router();
}
