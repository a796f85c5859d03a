import { DecimalField } from '../../../components/decimal-field.tsx';
import { MoneyField } from '../../../components/money-field.tsx';
import { SelectField, type Choice } from '../../../components/select-field.tsx';
import { TextField } from '../../../components/text-field.tsx';
import { WholeFields } from './whole-fields.tsx';

/** What the supplier sells, as its list reads. */
export function LeatherFields({ suppliers }: { suppliers: readonly Choice[] }) {
  return (
    <>
      <TextField name="name" label="Name" help="such as Oak tan russet 5–6 oz" />
      <MoneyField name="pricePerFt2" label="Price" per="ft²" />
      <fieldset>
        <legend className="sr-only">Weight</legend>
        <div className="flex flex-wrap items-start gap-x-4 gap-y-3">
          <DecimalField
            name="weightLowOz"
            label="Weight from"
            unit="oz"
            whenEmpty="null"
            optional
          />
          <DecimalField name="weightHighOz" label="to" unit="oz" whenEmpty="null" optional />
        </div>
      </fieldset>
      <TextField name="tannage" label="Tannage" optional />
      <TextField name="colour" label="Colour" optional />
      <TextField name="finish" label="Finish" optional />
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
      <WholeFields />
    </>
  );
}
