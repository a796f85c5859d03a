import { Router } from 'express';
import type { Context } from '../../context.ts';

export function toolRoutes(_context: Context): Router {
  return Router();
}
