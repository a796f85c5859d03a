import { listLeathers, readLeather } from '@hidewright/contract';
import { queryOptions } from '@tanstack/react-query';
import { call } from '../../lib/api.ts';
import { everyPage } from '../../lib/every-page.ts';

/** All leathers, newest first. */
export function leathersQuery() {
  return queryOptions({
    queryKey: ['leathers'],
    queryFn: ({ signal }) => everyPage((paging) => call(listLeathers, { query: paging, signal })),
  });
}

export function leatherQuery(id: number) {
  return queryOptions({
    queryKey: ['leathers', id],
    queryFn: ({ signal }) => call(readLeather, { params: { id }, signal }),
  });
}
