import {
  addPurchaseOrder,
  answerDelivery,
  cancelPurchaseOrder,
  changeAwaitedDay,
  changePurchaseOrder,
  changeReceipt,
  closeClaim,
  closePurchaseLine,
  correctCredit,
  openClaim,
  reopenPurchaseOrder,
  returnToSupplier,
  sendPurchaseOrder,
} from '@hidewright/contract';
import { useSend } from '../../lib/use-send.ts';

export const useAddPurchaseOrder = () => useSend(addPurchaseOrder);

export const useChangePurchaseOrder = () => useSend(changePurchaseOrder);

export const useSendPurchaseOrder = () => useSend(sendPurchaseOrder);

export const useCancelPurchaseOrder = () => useSend(cancelPurchaseOrder);

export const useChangeAwaitedDay = () => useSend(changeAwaitedDay);

export const useCloseLine = () => useSend(closePurchaseLine);

export const useReopenPurchaseOrder = () => useSend(reopenPurchaseOrder);

export const useChangeReceipt = () => useSend(changeReceipt);

export const useAnswerDelivery = () => useSend(answerDelivery);

export const useOpenClaim = () => useSend(openClaim);

export const useCloseClaim = () => useSend(closeClaim);

export const useCorrectCredit = () => useSend(correctCredit);

export const useReturnToSupplier = () => useSend(returnToSupplier);
