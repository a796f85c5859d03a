import { Router } from 'express';
import type { Context } from '../../context.ts';

export function activityRoutes(_context: Context): Router {
  return Router();
}
