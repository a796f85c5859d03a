import { Router } from 'express';
import {
  listSupplierReturns,
  returnToSupplier as returnEndpoint,
  type StockMovement,
} from '@hidewright/contract';
import type { Context } from '../../context.ts';
import { returnToSupplier } from '../../flows/return-to-supplier.ts';
import { serve } from '../../http/serve.ts';
import type { Work } from '../../work.ts';
import { findPurchaseOrder } from '../purchase-orders/draft-purchase-order.ts';
import { readMovements } from '../stock/read-ledger.ts';
import { StockMovement as Movement } from '../stock/stock-movement.entity.ts';

export function supplierReturnRoutes(context: Context): Router {
  const router = Router();

  serve(router, context, listSupplierReturns, async (work, { params }) => {
    const order = await findPurchaseOrder(work, params.id);
    const where = { purchaseOrderId: order.id, kind: 'reject' } as const;
    const moved = await work.em.find(Movement, where, { orderBy: { id: 'desc' } });
    const items = [];
    for (const { id } of moved) items.push(await readMovement(work, id));
    return { items };
  });

  serve(router, context, returnEndpoint, async (work, { params, body }) => {
    const { id } = await returnToSupplier(work, params.id, body);
    return readMovement(work, id);
  });

  return router;
}

async function readMovement({ em }: Work, id: number): Promise<StockMovement> {
  const [movement] = await readMovements(em, { id, limit: 1 });
  if (movement === undefined) throw new TypeError(`The ledger has no row ${id}`);
  return movement;
}
