import { listSupplierOffers } from '@hidewright/contract';
import { queryOptions } from '@tanstack/react-query';
import { call } from './api.ts';
import { everyPage } from './every-page.ts';

export type OfferedThing = { leatherId: number } | { hardwareId: number };

/** Everybody who sells a leather or a hardware, or all that a supplier sells. */
export function supplierOffersQuery(asked: OfferedThing | { supplierId: number }) {
  return queryOptions({
    queryKey: ['supplier-offers', asked],
    queryFn: ({ signal }) =>
      everyPage((paging) => call(listSupplierOffers, { query: { ...asked, ...paging }, signal })),
  });
}
