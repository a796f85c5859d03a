import {
  agreeQuote,
  changeQuote,
  createQuote,
  declineQuote,
  renewLink,
  reviseQuote,
  revokeLink,
  sendQuote,
} from '@hidewright/contract';
import { useSend } from '../../lib/use-send.ts';

export const useCreateQuote = () => useSend(createQuote);
export const useChangeQuote = () => useSend(changeQuote);
export const useSendQuote = () => useSend(sendQuote);
export const useRenewLink = () => useSend(renewLink);
export const useRevokeLink = () => useSend(revokeLink);
export const useAgreeQuote = () => useSend(agreeQuote);
export const useDeclineQuote = () => useSend(declineQuote);
export const useReviseQuote = () => useSend(reviseQuote);
