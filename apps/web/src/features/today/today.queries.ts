import { readToday } from '@hidewright/contract';
import { queryOptions } from '@tanstack/react-query';
import { call } from '../../lib/api.ts';

export function todayQuery() {
  return queryOptions({
    queryKey: ['today'],
    queryFn: ({ signal }) => call(readToday, { signal }),
  });
}
