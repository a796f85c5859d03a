import { listPresses } from '@hidewright/contract';
import { queryOptions } from '@tanstack/react-query';
import { call } from '../../lib/api.ts';

/** The presses, by name. */
export function pressesQuery() {
  return queryOptions({
    queryKey: ['presses'],
    queryFn: ({ signal }) => call(listPresses, { signal }),
  });
}
