import type { Invoice } from '@hidewright/contract';
import { useNavigate } from 'react-router-dom';
import { ConfirmDialog } from '../../../components/confirm-dialog.tsx';
import { say } from '../../../components/toast.ts';
import { useDiscardInvoice } from '../invoices.mutations.ts';

interface DiscardDialogProps {
  invoice: Invoice;
  open: boolean;
  onOpenChange: (open: boolean) => void;
}

export function DiscardDialog({ invoice, open, onOpenChange }: DiscardDialogProps) {
  const discard = useDiscardInvoice();
  const navigate = useNavigate();
  const { orderNumber } = invoice;
  return (
    <ConfirmDialog
      open={open}
      onOpenChange={onOpenChange}
      title="Discard this draft?"
      confirmWord="Discard the draft"
      tone="danger"
      onConfirm={async () => {
        await discard.mutateAsync({ params: { id: invoice.id } });
        await navigate('/books/invoices');
        say(`The draft for ${orderNumber ?? invoice.customerName} is discarded.`);
      }}
    >
      What was worded or chosen on its lines is lost.{' '}
      {orderNumber === null
        ? 'Its pieces lie on the shelf again.'
        : `${orderNumber} can be invoiced again.`}
    </ConfirmDialog>
  );
}
