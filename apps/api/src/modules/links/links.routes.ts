import { Router } from 'express';
import type { Context } from '../../context.ts';

export function linkRoutes(_context: Context): Router {
  return Router();
}
