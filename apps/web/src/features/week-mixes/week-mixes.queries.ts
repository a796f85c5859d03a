import { startWeekMix } from '@hidewright/contract';
import { queryOptions } from '@tanstack/react-query';
import { call } from '../../lib/api.ts';

/** What a week's mix can begin with, by the shop's own runs. */
export function weekStartQuery() {
  return queryOptions({
    queryKey: ['week-mixes', 'start'],
    queryFn: ({ signal }) => call(startWeekMix, { signal }),
  });
}
