import { useWatch } from 'react-hook-form';
import { AreaField } from '../../../components/area-field.tsx';
import { AreaPriceField } from '../../../components/area-price-field.tsx';
import { SelectField, type Choice } from '../../../components/select-field.tsx';
import { TextField } from '../../../components/text-field.tsx';
import { WeightField } from '../../../components/weight-field.tsx';
import { thicknessText } from '../../../lib/weight-words.ts';
import { WholeFields } from './whole-fields.tsx';

/** What the supplier sells, as its list reads. */
export function LeatherFields({ suppliers }: { suppliers: readonly Choice[] }) {
  return (
    <>
      <TextField name="name" label="Name" help="such as Oak tan russet 5–6 oz" />
      <AreaPriceField name="pricePerFt2" label="Price" />
      <fieldset>
        <legend className="sr-only">Weight</legend>
        <div className="flex flex-wrap items-start gap-x-4 gap-y-3">
          <WeightField name="weightLowOz" label="Weight from" help="or as thick as it is: 2.4 mm" />
          <WeightField name="weightHighOz" label="to" />
        </div>
        <Thickness />
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
      <AreaField
        name="reorderAtMm2"
        label="Order when less is free than"
        help="What to order counts on it; empty where it is bought for a run."
        optional
        whenEmpty="null"
      />
      <WholeFields />
    </>
  );
}

/** What was typed in ounces, in mm beside it. */
function Thickness() {
  const [weightLowOz, weightHighOz] = useWatch({ name: ['weightLowOz', 'weightHighOz'] }) as [
    ...(string | null)[],
  ];
  const text = thicknessText({
    weightLowOz: weightLowOz ?? null,
    weightHighOz: weightHighOz ?? null,
  });
  return text !== '' && <p className="mt-1 text-sm text-ink-soft">{`That is ${text}.`}</p>;
}
