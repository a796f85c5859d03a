import type { Leather } from '@hidewright/contract';
import { useWatch } from 'react-hook-form';
import { AreaField } from '../../../components/area-field.tsx';
import { DecimalField } from '../../../components/decimal-field.tsx';
import { More } from '../../../components/more.tsx';
import { SelectField } from '../../../components/select-field.tsx';

const forms: NonNullable<Leather['wholeForm']>[] = [
  'side',
  'hide',
  'back',
  'bend',
  'shoulder',
  'double shoulder',
  'belly',
];
const choices = forms.map((form) => ({ value: form, label: form }));

/** What it is bought as, so that a quote says how many must be bought whole. */
export function WholeFields() {
  const form = useWatch({ name: 'wholeForm' }) as string | null | undefined;
  return (
    <More
      word="Bought whole"
      note={form ? `as a ${form}` : undefined}
      names={['wholeForm', 'wholeAreaMm2', 'wholeUsablePercent']}
    >
      <p className="text-sm text-ink-soft">
        With a form and an area a quote says how many must be bought for the run.
      </p>
      <SelectField
        name="wholeForm"
        label="Form"
        optional
        placeholder="Not said"
        whenEmpty="null"
        choices={choices}
        short
      />
      <AreaField name="wholeAreaMm2" label="Area of a usual one" optional whenEmpty="null" />
      <DecimalField
        name="wholeUsablePercent"
        label="Of which can be used"
        unit="%"
        help="What is left beside belly edges, holes and brands."
      />
    </More>
  );
}
