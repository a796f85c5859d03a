import { NumberField } from '../../../components/number-field.tsx';
import { TextArea } from '../../../components/text-area.tsx';
import { TextField } from '../../../components/text-field.tsx';

export function SupplierFields() {
  return (
    <>
      <TextField name="name" label="Name" />
      <TextField
        name="email"
        type="email"
        label="E-mail address"
        optional
        help="Purchase orders go there; without one you hand them over yourself."
      />
      <TextField name="phone" type="tel" label="Phone" optional />
      <NumberField
        name="leadDays"
        label="Delivers within"
        unit="days"
        help="From the day an order is sent."
      />
      <TextArea name="note" label="Note" rows={3} optional />
    </>
  );
}
