import {
  addToCount,
  approveCount,
  cancelCount,
  countAgain,
  handInCount,
  openCount,
} from '@hidewright/contract';
import { useSend } from '../../lib/use-send.ts';

export const useOpenCount = () => useSend(openCount);

export const useAddToCount = () => useSend(addToCount);

export const useHandInCount = () => useSend(handInCount);

export const useCountAgain = () => useSend(countAgain);

export const useApproveCount = () => useSend(approveCount);

export const useCancelCount = () => useSend(cancelCount);
