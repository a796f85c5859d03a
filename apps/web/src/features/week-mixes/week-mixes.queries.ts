import { startWeekMix, workOutWeekMix, type WeekStart } from '@hidewright/contract';
import { queryOptions } from '@tanstack/react-query';
import { call } from '../../lib/api.ts';
import { weekToType } from './typed-week.ts';

/** What a week's mix can begin with, by the shop's own runs. */
export function weekStartQuery() {
  return queryOptions({
    queryKey: ['week-mixes', 'start'],
    queryFn: ({ signal }) => call(startWeekMix, { signal }),
  });
}

/** The mix of the week that the page opens with, so that there is something to look at before anything is typed. */
export function firstMixQuery(start: WeekStart, person: string) {
  const week = weekToType(start, person);
  return queryOptions({
    queryKey: ['week-mixes', 'first', week],
    queryFn: () => call(workOutWeekMix, { body: week }),
    enabled: week.kinds.every(({ name }) => name !== ''),
    retry: false,
  });
}
