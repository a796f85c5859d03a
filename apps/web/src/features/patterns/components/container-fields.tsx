import { LengthField } from '../../../components/length-field.tsx';
import { RadioCards } from '../../../components/radio-cards.tsx';
import { SelectField } from '../../../components/select-field.tsx';
import { useFreshErrors } from '../use-fresh-errors.ts';
import { FieldRow } from './field-row.tsx';

const forms = [
  { value: 'panel', label: 'Panel' },
  { value: 'strip', label: 'Strip', detail: 'cut to a length' },
];

/** What the pieces are cut from, how far apart, and how far from its edge. */
export function ContainerFields() {
  const form = useFreshErrors('definition.container', 'form');
  const long =
    form === 'strip'
      ? { name: 'lengthMm', label: 'Length' }
      : { name: 'heightMm', label: 'Height' };
  return (
    <>
      <RadioCards name="definition.container.form" label="Cut from" cards={forms} across />
      <FieldRow>
        <LengthField name="definition.container.widthMm" label="Width" whenEmpty="text" />
        <LengthField
          key={form}
          name={`definition.container.${long.name}`}
          label={long.label}
          whenEmpty="text"
        />
      </FieldRow>
    </>
  );
}

/** The least distance between two cuts, and the border that stays unused. */
export function ClearanceFields() {
  return (
    <FieldRow>
      <LengthField
        name="definition.spacingMm"
        label="Spacing"
        help="between two cuts"
        whenEmpty="text"
      />
      <LengthField name="definition.trimMm" label="Trim" help="unused border" whenEmpty="text" />
    </FieldRow>
  );
}

const turns = [
  { value: 'quarter turns', label: 'along or across the spine' },
  { value: 'with the spine', label: 'along the spine only' },
  { value: 'free', label: 'any way at all' },
];

/** How a piece may be turned against the spine. */
export function TurnsField() {
  return (
    <SelectField
      name="definition.turns"
      label="Pieces may lie"
      help="end for end they always may; leather stretches least along the spine"
      choices={turns}
    />
  );
}
