import { arrivalDay, leadTime, type LeadTime } from '@hidewright/domain';
import type { EntityManager } from '@mikro-orm/sqlite';
import { readDaysTaken } from '../../modules/purchase-orders/days-taken.ts';
import { Supplier } from '../../modules/suppliers/supplier.entity.ts';
import { itemTerms, type BoughtRow, type ItemTerms } from './item-terms.ts';
import { readOffersByItem, type OfferedThings } from './offers-by-item.ts';

/** Who a thing is ordered from, as they sell it, and how long they take. */
export interface ItemSource extends ItemTerms {
  lead: LeadTime;
  /** If it is ordered today: on a working day, as a delivery comes; null where nobody sells it. */
  arrivesOn: string | null;
}

/**
 * Where things are ordered, for all who ask for it; in as many questions whatever there is.
 * @param of only these things; left out, everything
 */
export async function readItemSources(
  em: EntityManager,
  today: string,
  of?: OfferedThings,
): Promise<(row: BoughtRow) => ItemSource> {
  const suppliers = new Map((await em.find(Supplier, {})).map((each) => [each.id, each]));
  const offers = await readOffersByItem(em, of);
  const daysTaken = await readDaysTaken(em, today);
  return (row) => {
    const sold = itemTerms(row, offers(`${row.of} ${row.id}`), suppliers);
    const took = sold.supplier === null ? [] : daysTaken(sold.supplier.id);
    const lead = leadTime(sold.leadDays, took);
    return { ...sold, lead, arrivesOn: sold.supplier === null ? null : arrivalDay(today, lead) };
  };
}
