import {
  changeInvoice,
  discardInvoice,
  draftInvoice,
  issueInvoice,
  recordPayment,
  removeInvoiceLine,
} from '@hidewright/contract';
import { useSend } from '../../lib/use-send.ts';

export const useDraftInvoice = () => useSend(draftInvoice);

export const useChangeInvoice = () => useSend(changeInvoice);

/** The invoice that was looked at is gone: only the lists are read again. */
export const useDiscardInvoice = () =>
  useSend(discardInvoice, {
    invalidates: [
      ['invoices', 'list'],
      ['invoices', 'orders-to-invoice'],
      ['invoices', 'shelf-drafts'],
      ['orders'],
      ['finished-pieces'],
      ['finished-piece'],
    ],
  });

export const useRemoveInvoiceLine = () => useSend(removeInvoiceLine);

export const useIssueInvoice = () => useSend(issueInvoice);

export const useRecordPayment = () => useSend(recordPayment);
