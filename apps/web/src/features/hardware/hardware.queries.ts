import { listHardware, readHardware } from '@hidewright/contract';
import { queryOptions } from '@tanstack/react-query';
import { call } from '../../lib/api.ts';

/** Hardware and supplies with their counts; one page holds what a small shop keeps. */
export function hardwareListQuery() {
  return queryOptions({
    queryKey: ['hardware'],
    queryFn: ({ signal }) => call(listHardware, { query: { limit: 200 }, signal }),
  });
}

export function hardwareQuery(id: number) {
  return queryOptions({
    queryKey: ['hardware', id],
    queryFn: ({ signal }) => call(readHardware, { params: { id }, signal }),
  });
}
