import { Router } from 'express';
import type { Context } from '../../context.ts';

export function peopleRoutes(_context: Context): Router {
  return Router();
}
