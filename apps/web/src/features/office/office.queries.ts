import { listActivities, listPeople, readWorkshop } from '@hidewright/contract';
import { infiniteQueryOptions, queryOptions } from '@tanstack/react-query';
import { call } from '../../lib/api.ts';

export function workshopQuery() {
  return queryOptions({
    queryKey: ['workshop'],
    queryFn: ({ signal }) => call(readWorkshop, { signal }),
  });
}

export function peopleQuery() {
  return queryOptions({
    queryKey: ['people'],
    queryFn: ({ signal }) => call(listPeople, { signal }),
  });
}

export function activitiesQuery() {
  return infiniteQueryOptions({
    queryKey: ['activities'],
    queryFn: ({ pageParam, signal }) =>
      call(listActivities, { query: pageParam === null ? {} : { cursor: pageParam }, signal }),
    initialPageParam: null as string | null,
    getNextPageParam: (last) => last.next,
  });
}
