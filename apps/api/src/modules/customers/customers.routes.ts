import { Router } from 'express';
import type { Context } from '../../context.ts';

export function customerRoutes(_context: Context): Router {
  return Router();
}
