import type { Invoice, InvoiceLine } from '@hidewright/contract';
import { ConfirmDialog } from '../../../components/confirm-dialog.tsx';
import { say } from '../../../components/toast.ts';
import { countText } from '../../../lib/formatting.ts';
import { useRemoveInvoiceLine } from '../invoices.mutations.ts';

interface PutBackDialogProps {
  invoice: Invoice;
  line: InvoiceLine;
  onClose: () => void;
}

/** One line of a draft from the shelf goes, and its pieces lie there again. */
export function PutBackDialog({ invoice, line, onClose }: PutBackDialogProps) {
  const remove = useRemoveInvoiceLine();
  const { id, version } = invoice;
  const what = `${countText(line.quantity)} × ${line.description}`;
  return (
    <ConfirmDialog
      open
      onOpenChange={onClose}
      title={`Take ${what} off this draft?`}
      confirmWord="Put back on the shelf"
      onConfirm={async () => {
        const params = { id, position: line.position };
        await remove.mutateAsync({ params, ifMatch: version });
        say(`${what}: on the shelf again.`);
      }}
    >
      The line goes, and the pieces lie on the shelf again at the cost they left with.
    </ConfirmDialog>
  );
}
