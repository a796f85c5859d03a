import { paymentMethod, recordPayment, type Invoice } from '@hidewright/contract';
import { DayField } from '../../../components/day-field.tsx';
import { Dialog } from '../../../components/dialog.tsx';
import { Form } from '../../../components/form.tsx';
import { MoneyField } from '../../../components/money-field.tsx';
import { RadioCards } from '../../../components/radio-cards.tsx';
import { TextField } from '../../../components/text-field.tsx';
import { say } from '../../../components/toast.ts';
import { moneyText } from '../../../lib/formatting.ts';
import { useWorkshop } from '../../../lib/workshop.tsx';
import { useRecordPayment } from '../invoices.mutations.ts';

interface PaymentDialogProps {
  invoice: Invoice;
  open: boolean;
  onOpenChange: (open: boolean) => void;
}

export function PaymentDialog({ invoice, open, onOpenChange }: PaymentDialogProps) {
  const { today } = useWorkshop();
  const send = useRecordPayment();
  const number = invoice.number ?? '';
  return (
    <Dialog
      open={open}
      onOpenChange={onOpenChange}
      title={`Payment for ${number}`}
      description={`${moneyText(invoice.open)} ${invoice.currency} is open. A payment stays in the books as it is entered.`}
    >
      <Form
        schema={recordPayment.body}
        defaults={{ amount: invoice.open, receivedOn: today, method: 'bank', note: '' }}
        submitWord="Record the payment"
        draftKey={`payment-${invoice.id}`}
        onSend={async (body) => {
          const paid = await send.mutateAsync({ params: { id: invoice.id }, body });
          onOpenChange(false);
          say(
            paid.state === 'paid'
              ? `${number} is paid.`
              : `${number}: ${moneyText(paid.open)} is still open.`,
          );
        }}
      >
        <MoneyField name="amount" label="Amount received" />
        <DayField name="receivedOn" label="Received on" max={today} />
        <RadioCards
          name="method"
          label="How"
          across
          cards={paymentMethod.options.map((method) => ({
            value: method,
            label: methodWords[method],
          }))}
        />
        <TextField
          name="note"
          label="Note"
          optional
          help="Such as the reference on the bank statement."
        />
      </Form>
    </Dialog>
  );
}

const methodWords = { bank: 'By bank', card: 'By card', cash: 'In cash', cheque: 'By cheque' };
