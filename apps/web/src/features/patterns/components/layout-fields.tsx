import { useWatch } from 'react-hook-form';
import { Checkbox } from '../../../components/checkbox.tsx';
import { LengthField } from '../../../components/length-field.tsx';
import { NumberField } from '../../../components/number-field.tsx';
import { RadioCards } from '../../../components/radio-cards.tsx';
import { ClearanceFields, ContainerFields, TurnsField } from './container-fields.tsx';
import { FieldRow } from './field-row.tsx';
import { OutlineFields } from './outline-fields.tsx';

const ways = [
  { value: 'outline', label: 'In rows', detail: 'which a hand repeats with the die' },
  { value: 'best found', label: 'As many as can be found', detail: 'searched for; takes a while' },
  { value: 'hand count', label: 'By hand count', detail: '“I get 21 from 11 × 13 in”' },
];

/** How many pieces the leather gives: worked out from the outline, or counted by hand. */
export function LayoutFields() {
  const byHand = useWatch({ name: 'definition.layoutBy' }) === 'hand count';
  return (
    <>
      <RadioCards name="definition.layoutBy" label="Pieces from the leather" cards={ways} />
      {byHand ? (
        <HandCountFields />
      ) : (
        <>
          <OutlineFields />
          <ContainerFields />
          <TurnsField />
          <ClearanceFields />
        </>
      )}
    </>
  );
}

function HandCountFields() {
  const alsoDrawn = useWatch({ name: 'definition.alsoDrawn' }) === true;
  return (
    <>
      <FieldRow>
        <NumberField name="definition.handCount.pieces" label="Pieces" whenEmpty="text" />
        <LengthField
          name="definition.handCount.widthMm"
          label="from a panel of"
          help="width"
          whenEmpty="text"
        />
        <LengthField
          name="definition.handCount.heightMm"
          label="by"
          help="height; 4 3/8 is fine"
          whenEmpty="text"
        />
      </FieldRow>
      <Checkbox name="definition.alsoDrawn" label="Draw the outline too; the count still holds" />
      {alsoDrawn && <OutlineFields />}
    </>
  );
}
