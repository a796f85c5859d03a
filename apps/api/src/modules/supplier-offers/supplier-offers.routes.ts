import { Router } from 'express';
import {
  addSupplierOffer,
  adoptSupplierOffer,
  changeSupplierOffer,
  listSupplierOffers,
  removeSupplierOffer,
} from '@hidewright/contract';
import type { Context } from '../../context.ts';
import { requireVersion } from '../../http/conditions.ts';
import { readCursor, toPage } from '../../http/paging.ts';
import { serve } from '../../http/serve.ts';
import { adoptOffer } from './adopt-supplier-offer.ts';
import { readOneOffer, readSupplierOffers } from './read-supplier-offers.ts';
import { addOffer, changeOffer, findOffer, removeOffer, thingOf } from './save-supplier-offer.ts';

export function supplierOfferRoutes(context: Context): Router {
  const router = Router();

  serve(router, context, listSupplierOffers, async ({ em }, { query }) => {
    const { cursor, limit, ...asked } = query;
    const after = readCursor(cursor);
    const rows = await readSupplierOffers(em, { ...asked, after, limit: limit + 1 });
    return toPage(rows, limit, ({ id }) => id);
  });

  serve(router, context, addSupplierOffer, async (work, { body }) => {
    const { id } = await addOffer(work, body);
    return readOneOffer(work.em, id);
  });

  serve(router, context, changeSupplierOffer, async (work, { params, body, ifMatch }) => {
    const offer = await findOffer(work, params.id);
    await requireVersion(work.em, { ...thingOf(offer), version: offer.version }, ifMatch);
    await changeOffer(work, offer, body);
    return readOneOffer(work.em, offer.id);
  });

  serve(router, context, removeSupplierOffer, async (work, { params }) => {
    const offer = await findOffer(work, params.id);
    await removeOffer(work, offer);
    return { removed: true as const };
  });

  serve(router, context, adoptSupplierOffer, async (work, { params }) => {
    const offer = await findOffer(work, params.id);
    await adoptOffer(work, offer);
    return readOneOffer(work.em, offer.id);
  });

  return router;
}
