import type { SupplierOfferReply } from '@hidewright/contract';
import type { EntityManager } from '@mikro-orm/sqlite';
import { readSupplierOffers } from '../../modules/supplier-offers/read-supplier-offers.ts';

export interface OfferedThings {
  leatherIds: readonly number[];
  hardwareIds: readonly number[];
}

/** Everything that SQLite has: no limit. */
const all = -1;

/** What is asked for each thing, the preferred offer first; by "leather 3", "hardware 7". */
export async function readOffersByItem(
  em: EntityManager,
  of?: OfferedThings,
): Promise<(key: string) => SupplierOfferReply[]> {
  const byItem = new Map<string, SupplierOfferReply[]>();
  for (const offer of await readSupplierOffers(em, { of, limit: all })) {
    const key = `${offer.of} ${offer.leatherId ?? offer.hardwareId}`;
    byItem.set(key, [...(byItem.get(key) ?? []), offer]);
  }
  return (key) => byItem.get(key) ?? [];
}
