import { search } from '@hidewright/contract';
import { queryOptions } from '@tanstack/react-query';
import { call } from '../lib/api.ts';

export function searchQuery(q: string) {
  return queryOptions({
    queryKey: ['search', q],
    queryFn: ({ signal }) => call(search, { query: { q }, signal }),
    enabled: q !== '',
  });
}
