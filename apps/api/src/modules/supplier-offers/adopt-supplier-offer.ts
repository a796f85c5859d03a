import { Decimal } from 'decimal.js';
import type { Work } from '../../work.ts';
import { Hardware } from '../hardware/hardware.entity.ts';
import { Leather } from '../leathers/leather.entity.ts';
import { logOffer, preferOffer } from './save-supplier-offer.ts';
import type { SupplierOffer } from './supplier-offer.entity.ts';

/**
 * Prefers an offer and takes its first price and its supplier over to the thing itself: quotes reckon with them from
 * now on. Nothing else ever changes a thing's own price.
 */
export async function adoptOffer(work: Work, offer: SupplierOffer): Promise<void> {
  await preferOffer(work, offer);
  const { supplierId } = offer;
  const price = new Decimal(offer.breaks[0]?.price ?? 0);
  if (offer.leatherId !== null) {
    const leather = await work.em.findOneOrFail(Leather, offer.leatherId);
    Object.assign(leather, { supplierId, pricePerFt2: price });
  } else {
    const hardware = await work.em.findOneOrFail(Hardware, offer.hardwareId ?? 0);
    const packSize = offer.multiple ?? hardware.packSize;
    Object.assign(hardware, { supplierId, unitPrice: price, packSize });
  }
  await work.em.flush();
  await logOffer(work, offer, 'reckons from now on with the offer for', {
    price: price.toFixed(),
  });
}
