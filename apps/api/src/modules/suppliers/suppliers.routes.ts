import { Router } from 'express';
import type { Context } from '../../context.ts';

export function supplierRoutes(_context: Context): Router {
  return Router();
}
