import type { Decimal } from 'decimal.js';
import type { Work } from '../../work.ts';
import { Hardware } from '../hardware/hardware.entity.ts';
import { Leather } from '../leathers/leather.entity.ts';
import { SupplierOffer } from './supplier-offer.entity.ts';

type Thing = Pick<SupplierOffer, 'leatherId' | 'hardwareId'>;

/** What the shop pays for a thing and to whom, as the thing itself says it. */
interface Present {
  supplierId: number;
  price: Decimal;
  multiple: number | null;
  /** the least that the price holds for */
  from: string;
}

/** At its own price, which quotes reckon with; null where it names nobody who sells it. */
export async function presentOf(
  { em }: Work,
  { leatherId, hardwareId }: Thing,
): Promise<Present | null> {
  if (leatherId !== null) {
    const { supplierId, pricePerFt2: price } = await em.findOneOrFail(Leather, leatherId);
    return supplierId === null ? null : { supplierId, price, multiple: null, from: '0' };
  }
  const hardware = await em.findOneOrFail(Hardware, hardwareId ?? 0);
  const { supplierId, unitPrice, packSize } = hardware;
  if (supplierId === null) return null;
  const multiple = packSize === 1 ? null : packSize;
  return { supplierId, price: unitPrice, multiple, from: String(packSize) };
}

/**
 * Before somebody else’s first offer is compared with it: what the shop pays today becomes the offer of the supplier
 * whom the thing names, and stays the preferred one; without a price too, for the supplier must not get lost.
 */
export async function keepPresentOffer(
  work: Work,
  { leatherId, hardwareId }: Thing,
  { supplierId, price, multiple, from }: Present,
): Promise<SupplierOffer> {
  const offer = work.em.create(SupplierOffer, {
    ...{ leatherId, hardwareId, supplierId, multiple },
    ...{ articleNumber: '', leadDays: null, minimum: null, preferred: true },
    breaks: [{ from, price: price.toFixed() }],
  });
  await work.em.flush();
  return offer;
}
