import {
  finishJob,
  holdForJob,
  letGo,
  pauseJob,
  putOffcutBack,
  resumeJob,
  returnFromJob,
  takeForJob,
} from '@hidewright/contract';
import { useSend } from '../../lib/use-send.ts';

export const useTakeForJob = () => useSend(takeForJob);
export const useHoldForJob = () => useSend(holdForJob);
export const useLetGo = () => useSend(letGo);
export const useFinishJob = () => useSend(finishJob);
export const useReturnFromJob = () => useSend(returnFromJob);
export const usePutOffcutBack = () => useSend(putOffcutBack);
export const usePauseJob = () => useSend(pauseJob);
export const useResumeJob = () => useSend(resumeJob);
