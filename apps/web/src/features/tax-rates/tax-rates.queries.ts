import { listTaxRates } from '@hidewright/contract';
import { queryOptions } from '@tanstack/react-query';
import { call } from '../../lib/api.ts';

/** The rates that the shop entered, and what its last invoice used. */
export function taxRatesQuery() {
  return queryOptions({
    queryKey: ['tax-rates'],
    queryFn: ({ signal }) => call(listTaxRates, { signal }),
  });
}
