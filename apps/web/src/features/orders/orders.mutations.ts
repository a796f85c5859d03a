import {
  cancelOrder,
  movePromisedDay,
  recordArrival,
  shipOrder,
  takeOnOrder,
} from '@hidewright/contract';
import { useSend } from '../../lib/use-send.ts';

export const useTakeOnOrder = () => useSend(takeOnOrder);
export const useRecordArrival = () => useSend(recordArrival);
export const useShipOrder = () => useSend(shipOrder);
export const useCancelOrder = () => useSend(cancelOrder);
export const useMovePromisedDay = () => useSend(movePromisedDay);
