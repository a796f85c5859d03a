import { Router } from 'express';
import type { Context } from '../../context.ts';

export function layoutRoutes(_context: Context): Router {
  return Router();
}
