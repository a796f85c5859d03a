import { changeLot, drawLot } from '@hidewright/contract';
import { useSend } from '../../lib/use-send.ts';

export const useChangeLot = () => useSend(changeLot);

export const useDrawLot = () => useSend(drawLot);
