import { Router } from 'express';
import type { Context } from '../../context.ts';

export function invoiceRoutes(_context: Context): Router {
  return Router();
}
