import {
  listPurchaseOrders,
  readPurchaseOrder,
  type PurchaseOrderState,
} from '@hidewright/contract';
import { infiniteQueryOptions, queryOptions } from '@tanstack/react-query';
import { call } from '../../lib/api.ts';

interface Wanted {
  state?: PurchaseOrderState | undefined;
  supplierId?: number | undefined;
}

/** Orders to suppliers, newest first, page by page. */
export function purchaseOrdersQuery(wanted: Wanted = {}) {
  return infiniteQueryOptions({
    queryKey: ['purchase-orders', 'list', wanted],
    queryFn: ({ signal, pageParam }) =>
      call(listPurchaseOrders, {
        query: { ...wanted, limit: 100, ...(pageParam && { cursor: pageParam }) },
        signal,
      }),
    initialPageParam: '',
    getNextPageParam: (last) => last.next,
  });
}

export function purchaseOrderQuery(id: number) {
  return queryOptions({
    queryKey: ['purchase-orders', id],
    queryFn: ({ signal }) => call(readPurchaseOrder, { params: { id }, signal }),
  });
}
