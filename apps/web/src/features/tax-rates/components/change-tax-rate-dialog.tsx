import { changeTaxRate, listTaxRates, type TaxRate } from '@hidewright/contract';
import { useQueryClient } from '@tanstack/react-query';
import { Checkbox } from '../../../components/checkbox.tsx';
import { Dialog } from '../../../components/dialog.tsx';
import { Form } from '../../../components/form.tsx';
import { TextField } from '../../../components/text-field.tsx';
import { say } from '../../../components/toast.ts';
import { call } from '../../../lib/api.ts';
import { percentText } from '../../../lib/formatting.ts';
import { useChangeTaxRate } from '../tax-rates.mutations.ts';
import { taxRatesQuery } from '../tax-rates.queries.ts';

interface ChangeTaxRateDialogProps {
  rate: TaxRate;
  onClose: () => void;
}

export function ChangeTaxRateDialog({ rate, onClose }: ChangeTaxRateDialogProps) {
  const send = useChangeTaxRate();
  const client = useQueryClient();
  const { queryKey } = taxRatesQuery();

  async function reload() {
    const now = await call(listTaxRates);
    client.setQueryData(queryKey, now);
    return typedOf(now.items.find(({ id }) => id === rate.id) ?? rate);
  }

  return (
    <Dialog
      open
      onOpenChange={onClose}
      title={`${rate.name}, ${percentText(rate.percent, 4)}`}
      description="The rate itself stays, since invoices were made with it. If it changed, enter the new one and retire this one."
    >
      <Form
        schema={changeTaxRate.body}
        defaults={typedOf(rate)}
        submitWord="Save"
        onReload={reload}
        onSend={async (body) => {
          const known = client.getQueryData(queryKey)?.items.find(({ id }) => id === rate.id);
          const ifMatch = known?.version ?? rate.version;
          const saved = await send.mutateAsync({ params: { id: rate.id }, body, ifMatch });
          onClose();
          say(saved.active ? `${saved.name} is saved.` : `${saved.name} is retired.`);
        }}
      >
        <TextField name="name" label="What it is called" />
        <Checkbox
          name="active"
          label="We still use it"
          help="A retired rate cannot be chosen for an invoice."
        />
      </Form>
    </Dialog>
  );
}

const typedOf = ({ name, active }: TaxRate) => ({ name, active });
