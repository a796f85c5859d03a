import { listOrderSuggestions } from '@hidewright/contract';
import { queryOptions } from '@tanstack/react-query';
import { call } from '../../lib/api.ts';

/** What is due, or everything that is bought. Read anew each time: every job and delivery changes it. */
export function toOrderQuery(show: 'due' | 'all') {
  return queryOptions({
    queryKey: ['order-suggestions', show],
    queryFn: ({ signal }) => call(listOrderSuggestions, { query: { show }, signal }),
    staleTime: 0,
  });
}
