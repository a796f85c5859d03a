import { Router } from 'express';
import type { Context } from '../../context.ts';

export function purchaseOrderRoutes(_context: Context): Router {
  return Router();
}
