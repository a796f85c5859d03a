import { Router } from 'express';
import type { Context } from '../../context.ts';

export function workshopRoutes(_context: Context): Router {
  return Router();
}
