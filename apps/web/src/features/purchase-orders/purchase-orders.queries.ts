import {
  listClaims,
  listLots,
  listPurchaseOrders,
  listReceipts,
  listSupplierReturns,
  readPurchaseOrder,
  type PurchaseOrderState,
} from '@hidewright/contract';
import { infiniteQueryOptions, queryOptions } from '@tanstack/react-query';
import { call } from '../../lib/api.ts';
import { everyPage } from '../../lib/every-page.ts';

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

/** All orders of which something is still to come. */
export function awaitedOrdersQuery() {
  return queryOptions({
    queryKey: ['purchase-orders', 'awaited'],
    queryFn: ({ signal }) =>
      everyPage((paging) =>
        call(listPurchaseOrders, { query: { awaited: 'yes', ...paging }, signal }),
      ),
  });
}

/** Every lot on the rack, to choose what goes out to be worked on. */
export function rackQuery() {
  return queryOptions({
    queryKey: ['purchase-orders', 'rack'],
    queryFn: ({ signal }) =>
      everyPage((paging) => call(listLots, { query: { onRack: 'yes', ...paging }, signal })),
  });
}

export function purchaseOrderQuery(id: number) {
  return queryOptions({
    queryKey: ['purchase-orders', id],
    queryFn: ({ signal }) => call(readPurchaseOrder, { params: { id }, signal }),
  });
}

/** The deliveries of an order, newest first. */
export function receiptsQuery(purchaseOrderId: number) {
  return queryOptions({
    queryKey: ['purchase-orders', purchaseOrderId, 'receipts'],
    queryFn: ({ signal }) =>
      everyPage((paging) => call(listReceipts, { query: { purchaseOrderId, ...paging }, signal })),
  });
}

/** Deliveries that came without an order, newest first, page by page. */
export function receiptsWithoutOrderQuery() {
  return infiniteQueryOptions({
    queryKey: ['purchase-orders', 'without order'],
    queryFn: ({ signal, pageParam }) =>
      call(listReceipts, {
        query: { withoutOrder: 'yes', limit: 20, ...(pageParam && { cursor: pageParam }) },
        signal,
      }),
    initialPageParam: '',
    getNextPageParam: (last) => last.next,
  });
}

/** What of an order went back to its supplier. */
export function supplierReturnsQuery(id: number) {
  return queryOptions({
    queryKey: ['purchase-orders', id, 'returns'],
    queryFn: ({ signal }) => call(listSupplierReturns, { params: { id }, signal }),
  });
}

export function claimsQuery(id: number) {
  return queryOptions({
    queryKey: ['purchase-orders', id, 'claims'],
    queryFn: ({ signal }) => call(listClaims, { params: { id }, signal }),
  });
}
