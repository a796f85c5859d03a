import { issueInvoice, readInvoice, type Invoice } from '@hidewright/contract';
import { useQueryClient } from '@tanstack/react-query';
import { useRevalidator } from 'react-router-dom';
import { DayField } from '../../../components/day-field.tsx';
import { Dialog } from '../../../components/dialog.tsx';
import { Form } from '../../../components/form.tsx';
import { say } from '../../../components/toast.ts';
import { call } from '../../../lib/api.ts';
import { moneyText } from '../../../lib/formatting.ts';
import { useWorkshop } from '../../../lib/workshop.tsx';
import { useIssueInvoice } from '../invoices.mutations.ts';
import { invoiceQuery } from '../invoices.queries.ts';

interface IssueDialogProps {
  invoice: Invoice;
  open: boolean;
  onOpenChange: (open: boolean) => void;
}

export function IssueDialog({ invoice, open, onOpenChange }: IssueDialogProps) {
  const { today } = useWorkshop();
  const send = useIssueInvoice();
  const client = useQueryClient();
  const { revalidate } = useRevalidator();
  const { id, currency, customerName } = invoice;
  const { queryKey } = invoiceQuery(id);
  const defaults = { issuedOn: today };

  async function reload() {
    client.setQueryData(queryKey, await call(readInvoice, { params: { id } }));
    return defaults;
  }

  return (
    <Dialog
      open={open}
      onOpenChange={onOpenChange}
      title={`Issue the invoice for ${moneyText(invoice.total)} ${currency} to ${customerName}?`}
      description="It gets the next number and is entered in the books on that day. Afterwards it cannot be changed, taken back or deleted."
    >
      <Form
        schema={issueInvoice.body}
        defaults={defaults}
        submitWord="Issue the invoice"
        onReload={reload}
        onSend={async (body) => {
          const ifMatch = client.getQueryData(queryKey)?.version ?? invoice.version;
          const issued = await send.mutateAsync({ params: { id }, body, ifMatch });
          onOpenChange(false);
          // The way back at the top of the page names it by its number from now on.
          void revalidate();
          say(`Invoice ${issued.number ?? ''} is issued.`);
        }}
      >
        <DayField name="issuedOn" label="Issued on" max={today} />
      </Form>
    </Dialog>
  );
}
