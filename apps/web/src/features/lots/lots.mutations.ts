import { changeLot, drawLot, layOnLot } from '@hidewright/contract';
import { useSend } from '../../lib/use-send.ts';

export const useChangeLot = () => useSend(changeLot);

export const useDrawLot = () => useSend(drawLot);

/** It changes nothing that is shown elsewhere. */
export const useLayOnLot = () => useSend(layOnLot, { invalidates: [] });
