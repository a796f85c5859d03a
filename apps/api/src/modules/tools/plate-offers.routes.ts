import { Router } from 'express';
import {
  addPlateOffer,
  changePlateOffer,
  listPlateOffers,
  removePlateOffer,
  type PlateOfferReply,
} from '@hidewright/contract';
import type { Context } from '../../context.ts';
import { assignDefined } from '../../db/assign-defined.ts';
import { decimals } from '../../db/decimals.ts';
import { requireVersion } from '../../http/conditions.ts';
import { moneyText } from '../../http/decimal-text.ts';
import { invalid, notFound } from '../../http/problem.ts';
import { serve } from '../../http/serve.ts';
import type { Work } from '../../work.ts';
import { logDeed } from '../activity/activity-log.ts';
import { PlateOffer } from './plate-offer.entity.ts';

export function plateOfferRoutes(context: Context): Router {
  const router = Router();

  serve(router, context, listPlateOffers, async ({ em }) => {
    const offers = await em.find(PlateOffer, {}, { orderBy: { price: 'asc', id: 'asc' } });
    return { items: offers.map(toReply) };
  });

  serve(router, context, addPlateOffer, async (work, { body }) => {
    const { metal, lifeUses, price } = body;
    await requireFree(work, metal);
    const offer = work.em.create(PlateOffer, { metal, lifeUses, ...decimals({ price }) });
    await work.em.flush();
    await note(work, offer, 'entered the price of');
    return toReply(offer);
  });

  serve(router, context, changePlateOffer, async (work, { params, body, ifMatch }) => {
    const offer = await findOffer(work, params.id);
    const { id, version } = offer;
    await requireVersion(work.em, { kind: 'plate offer', id, version }, ifMatch);
    const { lifeUses, price } = body;
    assignDefined(offer, { lifeUses, ...decimals({ price }) });
    await work.em.flush();
    await note(work, offer, 'changed the price or life of');
    return toReply(offer);
  });

  serve(router, context, removePlateOffer, async (work, { params }) => {
    const offer = await findOffer(work, params.id);
    await note(work, offer, 'took off the list');
    await work.em.remove(offer).flush();
    return { removed: true as const };
  });

  return router;
}

/** @throws {Problem} 404 */
async function findOffer({ em }: Work, id: number): Promise<PlateOffer> {
  const offer = await em.findOne(PlateOffer, id);
  if (offer === null) throw notFound('metal on the list');
  return offer;
}

async function requireFree({ em }: Work, metal: PlateOffer['metal']): Promise<void> {
  if ((await em.findOne(PlateOffer, { metal })) === null) return;
  const message = `There is a price for ${metal} already. Change that one, or choose another metal.`;
  throw invalid([{ field: 'metal', message }]);
}

async function note(work: Work, offer: PlateOffer, deed: string): Promise<void> {
  await logDeed(work, {
    action: `${deed} ${offer.metal} plates`,
    subjectKind: 'plate offer',
    subjectId: offer.id,
    detail: { price: moneyText(offer.price), lifeUses: offer.lifeUses },
  });
}

const toReply = (offer: PlateOffer): PlateOfferReply => ({
  id: offer.id,
  metal: offer.metal,
  price: moneyText(offer.price),
  lifeUses: offer.lifeUses,
  version: offer.version,
});
