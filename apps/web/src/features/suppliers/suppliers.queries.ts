import { listSuppliers, readSupplier } from '@hidewright/contract';
import { queryOptions } from '@tanstack/react-query';
import { call } from '../../lib/api.ts';

/** The suppliers, newest first; one page holds those of a small shop. */
export function suppliersQuery() {
  return queryOptions({
    queryKey: ['suppliers'],
    queryFn: ({ signal }) => call(listSuppliers, { query: { limit: 200 }, signal }),
  });
}

export function supplierQuery(id: number) {
  return queryOptions({
    queryKey: ['suppliers', id],
    queryFn: ({ signal }) => call(readSupplier, { params: { id }, signal }),
  });
}
