import { MoneyField } from '../../../components/money-field.tsx';
import { NumberField } from '../../../components/number-field.tsx';
import { RadioCards } from '../../../components/radio-cards.tsx';
import { SelectField, type Choice } from '../../../components/select-field.tsx';
import { TextField } from '../../../components/text-field.tsx';

const kinds = [
  { value: 'hardware', label: 'Hardware', detail: 'rivets, snaps, rings' },
  { value: 'supplies', label: 'Supplies', detail: 'thread, dye, boxes' },
];

export function HardwareFields({ suppliers }: { suppliers: readonly Choice[] }) {
  return (
    <>
      <RadioCards name="kind" label="Kind" cards={kinds} across />
      <TextField name="name" label="Name" help="such as Copper rivet 9 mm" />
      <MoneyField name="unitPrice" label="Price" per="piece" />
      <NumberField name="packSize" label="In packs of" unit="pieces" />
      <NumberField
        name="reorderAt"
        label="Keep at least"
        unit="free"
        help="Below that, with what is on order counted in, it shows as short."
      />
      {suppliers.length > 0 && (
        <SelectField
          name="supplierId"
          label="Supplier"
          optional
          placeholder="None yet"
          whenEmpty="null"
          choices={suppliers}
        />
      )}
    </>
  );
}
