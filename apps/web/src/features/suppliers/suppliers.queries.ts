import { listSuppliers, readSupplier } from '@hidewright/contract';
import { queryOptions } from '@tanstack/react-query';
import { call } from '../../lib/api.ts';
import { everyPage } from '../../lib/every-page.ts';

/** All suppliers, newest first. */
export function suppliersQuery() {
  return queryOptions({
    queryKey: ['suppliers'],
    queryFn: ({ signal }) => everyPage((paging) => call(listSuppliers, { query: paging, signal })),
  });
}

export function supplierQuery(id: number) {
  return queryOptions({
    queryKey: ['suppliers', id],
    queryFn: ({ signal }) => call(readSupplier, { params: { id }, signal }),
  });
}
