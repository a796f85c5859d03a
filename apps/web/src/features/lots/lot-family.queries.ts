import {
  readLastTimeOfOrder,
  readLastTimeOfQuote,
  readLotFamily,
  readOrderLeather,
} from '@hidewright/contract';
import { queryOptions } from '@tanstack/react-query';
import { call } from '../../lib/api.ts';

export function lotFamilyQuery(id: number) {
  return queryOptions({
    queryKey: ['lots', id, 'family'],
    queryFn: ({ signal }) => call(readLotFamily, { params: { id }, signal }),
  });
}

/** What an order was cut from. */
export function orderLeatherQuery(id: number) {
  return queryOptions({
    queryKey: ['orders', id, 'leather'],
    queryFn: ({ signal }) => call(readOrderLeather, { params: { id }, signal }),
  });
}

/** What this customer's run of the same pattern before this one was cut from. */
export function lastTimeQuery({ of, id }: { of: 'order' | 'quote'; id: number }) {
  return queryOptions({
    queryKey: [of === 'order' ? 'orders' : 'quotes', id, 'last-time'],
    queryFn: ({ signal }) =>
      of === 'order'
        ? call(readLastTimeOfOrder, { params: { id }, signal })
        : call(readLastTimeOfQuote, { params: { id }, signal }),
  });
}
