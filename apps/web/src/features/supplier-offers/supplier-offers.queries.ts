import { listSupplierOffers } from '@hidewright/contract';
import { queryOptions } from '@tanstack/react-query';
import { call } from '../../lib/api.ts';

export type OfferedThing = { leatherId: number } | { hardwareId: number };

/** Who sells a leather or a hardware, or what a supplier sells; one page holds them all. */
export function supplierOffersQuery(asked: OfferedThing | { supplierId: number }) {
  return queryOptions({
    queryKey: ['supplier-offers', asked],
    queryFn: ({ signal }) => call(listSupplierOffers, { query: { ...asked, limit: 200 }, signal }),
  });
}
