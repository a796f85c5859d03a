import { Router } from 'express';
import type { Context } from '../../context.ts';

export function hardwareRoutes(_context: Context): Router {
  return Router();
}
