import { agreeOffer, readOffer } from '@hidewright/contract';
import { queryOptions } from '@tanstack/react-query';
import { call } from '../../lib/api.ts';
import { useSend } from '../../lib/use-send.ts';

export function offerQuery(token: string) {
  return queryOptions({
    queryKey: ['offer', token],
    queryFn: ({ signal }) => call(readOffer, { params: { token }, signal }),
  });
}

export const useAgreeOffer = (token: string) =>
  useSend(agreeOffer, { invalidates: [['offer', token]] });
