import { usualOffer } from '@hidewright/domain';
import { hardwareQuery } from '../../../features/hardware/hardware.queries.ts';
import { leatherQuery } from '../../../features/leathers/leathers.queries.ts';
import { supplierOffersQuery, type OfferedThing } from '../../../lib/supplier-offers.queries.ts';
import { queryClient } from '../../../lib/query-client.ts';

/** Who a leather or a hardware is usually bought from, as what to order has it; null where nobody is named. */
export async function readUsualSupplier(thing: OfferedThing): Promise<number | null> {
  const [{ supplierId }, offers] = await Promise.all([
    'leatherId' in thing
      ? queryClient.fetchQuery(leatherQuery(thing.leatherId))
      : queryClient.fetchQuery(hardwareQuery(thing.hardwareId)),
    queryClient.fetchQuery(supplierOffersQuery(thing)),
  ]);
  return usualOffer(offers.items, supplierId)?.supplierId ?? supplierId;
}
