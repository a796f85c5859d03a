import { Router } from 'express';
import {
  closeClaim as closeEndpoint,
  correctCredit as correctEndpoint,
  draftClaim as draftEndpoint,
  listClaims,
  openClaim as openEndpoint,
} from '@hidewright/contract';
import type { Context } from '../../context.ts';
import { draftClaim } from '../../flows/draft-claim.ts';
import { openClaim } from '../../flows/open-claim.ts';
import { requireVersion } from '../../http/conditions.ts';
import { serve } from '../../http/serve.ts';
import type { Work } from '../../work.ts';
import { findPurchaseOrder } from '../purchase-orders/draft-purchase-order.ts';
import { closeClaim, findClaim } from './close-claim.ts';
import { correctCredit } from './note-credit.ts';
import { readClaimList, readOneClaim } from './read-claims.ts';
import type { SupplierClaim } from './supplier-claim.entity.ts';

export function supplierClaimRoutes(context: Context): Router {
  const router = Router();

  serve(router, context, listClaims, async (work, { params }) => {
    const { id } = await findPurchaseOrder(work, params.id);
    return { items: await readClaimList(work.em, { purchaseOrderId: id }) };
  });

  serve(router, context, draftEndpoint, async (work, { params }) => {
    const { order: _order, lines: _lines, ...draft } = await draftClaim(work, params.id);
    return draft;
  });

  serve(router, context, openEndpoint, async (work, { params, body }) => {
    const asked = { ...body, receiptId: params.id, mailIsSet: context.mailer.available };
    return readOneClaim(work.em, await openClaim(work, asked));
  });

  serve(router, context, closeEndpoint, async (work, { params, body, ifMatch }) => {
    const claim = await claimAsRead(work, params.id, ifMatch);
    await closeClaim(work, claim, body);
    return readOneClaim(work.em, claim.id);
  });

  serve(router, context, correctEndpoint, async (work, { params, body, ifMatch }) => {
    const claim = await claimAsRead(work, params.id, ifMatch);
    await correctCredit(work, claim, body);
    return readOneClaim(work.em, claim.id);
  });

  return router;
}

/** @throws {Problem} 404, 412 when somebody changed it meanwhile */
async function claimAsRead(work: Work, id: number, ifMatch: number): Promise<SupplierClaim> {
  const claim = await findClaim(work, id);
  const { version } = claim;
  await requireVersion(work.em, { kind: 'supplier claim', id, version }, ifMatch);
  return claim;
}
