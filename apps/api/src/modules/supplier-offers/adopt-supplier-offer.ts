import { isPriceKnown } from '@hidewright/domain';
import { Decimal } from 'decimal.js';
import { wrongState } from '../../http/problem.ts';
import type { Work } from '../../work.ts';
import { Hardware } from '../hardware/hardware.entity.ts';
import { Leather } from '../leathers/leather.entity.ts';
import { logOffer, preferOffer } from './save-supplier-offer.ts';
import type { SupplierOffer } from './supplier-offer.entity.ts';

/**
 * Prefers an offer and takes its first price and its supplier over to the thing itself: quotes reckon with them from
 * now on. Nothing else ever changes a thing's own price.
 * @throws {Problem} 409 while the offer has no price
 */
export async function adoptOffer(work: Work, offer: SupplierOffer): Promise<void> {
  const { supplierId, breaks } = offer;
  const first = breaks[0]?.price ?? '0';
  if (!isPriceKnown(first)) {
    const sentence = 'No price of theirs is known. Enter it with their offer, then use it.';
    throw wrongState(sentence, ['change the offer']);
  }
  await preferOffer(work, offer);
  const price = new Decimal(first);
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
