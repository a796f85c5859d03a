import { changeFinishedPiece, countFinished, takeFinished } from '@hidewright/contract';
import { useSend } from '../../lib/use-send.ts';

export const useTakeFinished = () => useSend(takeFinished);
export const useCountFinished = () => useSend(countFinished);
export const useChangeFinished = () => useSend(changeFinishedPiece);
