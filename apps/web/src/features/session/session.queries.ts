import { readSession } from '@hidewright/contract';
import { queryOptions } from '@tanstack/react-query';
import { call } from '../../lib/api.ts';
import { sessionKey } from '../../lib/query-client.ts';

export function sessionQuery() {
  return queryOptions({
    queryKey: sessionKey,
    queryFn: ({ signal }) => call(readSession, { signal }),
    staleTime: 60_000,
  });
}
