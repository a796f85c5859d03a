import { changeInvoice, readInvoice, type Invoice } from '@hidewright/contract';
import { useQueryClient } from '@tanstack/react-query';
import { Dialog } from '../../../components/dialog.tsx';
import { Form } from '../../../components/form.tsx';
import { SelectField, type Choice } from '../../../components/select-field.tsx';
import { TextField } from '../../../components/text-field.tsx';
import { say } from '../../../components/toast.ts';
import { call } from '../../../lib/api.ts';
import { useChangeInvoice } from '../invoices.mutations.ts';
import { invoiceQuery } from '../invoices.queries.ts';

interface ChangeLinesDialogProps {
  invoice: Invoice;
  rates: readonly Choice[];
  open: boolean;
  onOpenChange: (open: boolean) => void;
}

/** Words and tax can be changed on a draft; quantity and price are what was agreed. */
export function ChangeLinesDialog({ invoice, rates, open, onOpenChange }: ChangeLinesDialogProps) {
  const send = useChangeInvoice();
  const client = useQueryClient();
  const { id } = invoice;
  const { queryKey } = invoiceQuery(id);

  async function reload() {
    const now = await call(readInvoice, { params: { id } });
    client.setQueryData(queryKey, now);
    return typedOf(now);
  }

  return (
    <Dialog
      open={open}
      onOpenChange={onOpenChange}
      title="Change the lines"
      description="Quantities and prices stay as they were agreed."
    >
      <Form
        schema={changeInvoice.body}
        defaults={typedOf(invoice)}
        submitWord="Save"
        draftKey={`invoice-lines-${id}`}
        onReload={reload}
        onSend={async (body) => {
          const ifMatch = client.getQueryData(queryKey)?.version ?? invoice.version;
          await send.mutateAsync({ params: { id }, body, ifMatch });
          onOpenChange(false);
          say('The draft is worked out again.');
        }}
      >
        {invoice.lines.map(({ position }, at) => (
          <fieldset key={position} className="space-y-3">
            <legend className="mb-1 text-sm text-ink-soft">Line {position}</legend>
            <TextField name={`lines.${at}.description`} label="For" />
            <SelectField
              name={`lines.${at}.taxRateId`}
              label="Tax"
              choices={rates}
              placeholder="No tax applies"
              whenEmpty="null"
            />
          </fieldset>
        ))}
      </Form>
    </Dialog>
  );
}

const typedOf = ({ lines }: Invoice) => ({
  lines: lines.map(({ position, description, taxRateId }) => ({
    position,
    description,
    taxRateId,
  })),
});
