import { addTaxRate, type TaxRate } from '@hidewright/contract';
import { DecimalField } from '../../../components/decimal-field.tsx';
import { Form } from '../../../components/form.tsx';
import { TextField } from '../../../components/text-field.tsx';
import { useAddTaxRate } from '../tax-rates.mutations.ts';

interface AddTaxRateFormProps {
  onAdded: (rate: TaxRate) => void;
  /** Blank again after each. */
  again?: boolean | undefined;
}

export function AddTaxRateForm({ onAdded, again }: AddTaxRateFormProps) {
  const send = useAddTaxRate();
  return (
    <Form
      schema={addTaxRate.body}
      defaults={{ name: '', percent: '' }}
      submitWord="Enter the rate"
      draftKey="tax-rate-new"
      again={again}
      onSend={async (body) => onAdded(await send.mutateAsync({ body }))}
    >
      <TextField
        name="name"
        label="What it is called"
        help="As it stands on your invoices, such as Sales tax."
      />
      <DecimalField name="percent" label="Rate" unit="%" />
    </Form>
  );
}
