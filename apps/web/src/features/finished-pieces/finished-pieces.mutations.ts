import {
  changeFinishedPiece,
  countFinished,
  putOnShelf,
  sellFinished,
  takeFinished,
} from '@hidewright/contract';
import { useSend } from '../../lib/use-send.ts';

export const usePutOnShelf = () => useSend(putOnShelf);
export const useTakeFinished = () => useSend(takeFinished);
export const useSellFinished = () => useSend(sellFinished);
export const useCountFinished = () => useSend(countFinished);
export const useChangeFinished = () => useSend(changeFinishedPiece);
