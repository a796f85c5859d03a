import { useWatch } from 'react-hook-form';
import { AreaField } from '../../../components/area-field.tsx';
import { Checkbox } from '../../../components/checkbox.tsx';
import { DecimalField } from '../../../components/decimal-field.tsx';
import { More } from '../../../components/more.tsx';
import { NumberField } from '../../../components/number-field.tsx';
import { SelectField, type Choice } from '../../../components/select-field.tsx';
import { TextField } from '../../../components/text-field.tsx';
import { BreakFields } from './break-fields.tsx';

interface OfferFieldsProps {
  of: 'leather' | 'hardware';
  suppliers: readonly Choice[];
}

/** Who sells it for how much; what they call it and how they pack it stands behind. */
export function OfferFields({ of, suppliers }: OfferFieldsProps) {
  return (
    <>
      <SelectField
        name="supplierId"
        label="Supplier"
        placeholder="Choose a supplier"
        whenEmpty="text"
        choices={suppliers}
      />
      <BreakFields of={of} />
      <HowItIsSold of={of} />
      <Checkbox name="preferred" label="We usually buy it here" />
    </>
  );
}

const names = ['articleNumber', 'leadDays', 'minimum', 'multiple'];

function HowItIsSold({ of }: Pick<OfferFieldsProps, 'of'>) {
  const [articleNumber, leadDays] = useWatch({ name: names }) as [string, number | null];
  const note = [articleNumber, typeof leadDays === 'number' && `${leadDays} days`].filter(Boolean);
  return (
    <More word="Article number, days, pack" note={note.join(', ')} names={names}>
      <TextField name="articleNumber" label="Their article number" optional />
      <NumberField
        name="leadDays"
        label="Takes"
        unit="days"
        optional
        whenEmpty="null"
        help="Left empty, it takes as long as the supplier usually does."
      />
      {of === 'leather' ? (
        <>
          <AreaField name="minimum" label="Sold from" optional whenEmpty="null" />
          <AreaField name="multiple" label="In steps of" optional whenEmpty="null" />
        </>
      ) : (
        <>
          <DecimalField name="minimum" label="Sold from" unit="pieces" optional whenEmpty="null" />
          <DecimalField
            name="multiple"
            label="In packs of"
            unit="pieces"
            optional
            whenEmpty="null"
          />
        </>
      )}
    </More>
  );
}
