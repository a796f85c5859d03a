import { listSupplierOffers } from '@hidewright/contract';
import { queryOptions } from '@tanstack/react-query';
import { call } from '../../lib/api.ts';

export type OfferedThing = { leatherId: number } | { hardwareId: number };

/** Who sells a leather or a hardware; one page holds them all. */
export function supplierOffersQuery(thing: OfferedThing) {
  return queryOptions({
    queryKey: ['supplier-offers', thing],
    queryFn: ({ signal }) => call(listSupplierOffers, { query: { ...thing, limit: 200 }, signal }),
  });
}
