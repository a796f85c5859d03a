import {
  changeInvoice,
  discardInvoice,
  draftInvoice,
  issueInvoice,
  recordPayment,
} from '@hidewright/contract';
import { useSend } from '../../lib/use-send.ts';

export const useDraftInvoice = () => useSend(draftInvoice);

export const useChangeInvoice = () => useSend(changeInvoice);

/** The invoice that was looked at is gone: only the lists are read again. */
export const useDiscardInvoice = () =>
  useSend(discardInvoice, {
    invalidates: [['invoices', 'list'], ['invoices', 'orders-to-invoice'], ['orders']],
  });

export const useIssueInvoice = () => useSend(issueInvoice);

export const useRecordPayment = () => useSend(recordPayment);
