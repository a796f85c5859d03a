import { draftSuggested, orderByHand } from '@hidewright/contract';
import { useSend } from '../../lib/use-send.ts';

export const useDraftSuggested = () => useSend(draftSuggested);
export const useOrderByHand = () => useSend(orderByHand);
