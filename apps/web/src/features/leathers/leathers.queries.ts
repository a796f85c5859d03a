import { listLeathers, readLeather } from '@hidewright/contract';
import { queryOptions } from '@tanstack/react-query';
import { call } from '../../lib/api.ts';

/** The leathers, newest first; one page holds what a small shop buys. */
export function leathersQuery() {
  return queryOptions({
    queryKey: ['leathers'],
    queryFn: ({ signal }) => call(listLeathers, { query: { limit: 200 }, signal }),
  });
}

export function leatherQuery(id: number) {
  return queryOptions({
    queryKey: ['leathers', id],
    queryFn: ({ signal }) => call(readLeather, { params: { id }, signal }),
  });
}
