import {
  addLotPhoto,
  changeLot,
  drawLot,
  layOnLot,
  startLotSearch,
  stopLotSearch,
  type LotSearch,
} from '@hidewright/contract';
import { useQueryClient } from '@tanstack/react-query';
import { useSend } from '../../lib/use-send.ts';
import { lotSearchQuery } from './lots.queries.ts';

export const useChangeLot = () => useSend(changeLot);

export const useDrawLot = () => useSend(drawLot);

/** Nothing shows it until the drawing is saved. */
export const useAddLotPhoto = () => useSend(addLotPhoto, { invalidates: [] });

/** It changes nothing that is shown elsewhere. */
export const useLayOnLot = () => useSend(layOnLot, { invalidates: [] });

export const useStartLotSearch = () => useSend(startLotSearch, { invalidates: [] });

/** The reply is what it found by then. */
export function useStopLotSearch() {
  const client = useQueryClient();
  return useSend(stopLotSearch, {
    invalidates: [],
    onSent: (search: LotSearch) => client.setQueryData(lotSearchQuery(search.id).queryKey, search),
  });
}
