import {
  addPurchaseOrder,
  cancelPurchaseOrder,
  changePurchaseOrder,
  sendPurchaseOrder,
} from '@hidewright/contract';
import { useSend } from '../../lib/use-send.ts';

export const useAddPurchaseOrder = () => useSend(addPurchaseOrder);

export const useChangePurchaseOrder = () => useSend(changePurchaseOrder);

export const useSendPurchaseOrder = () => useSend(sendPurchaseOrder);

export const useCancelPurchaseOrder = () => useSend(cancelPurchaseOrder);
