import { DecimalField } from '../../../components/decimal-field.tsx';
import { RadioCards } from '../../../components/radio-cards.tsx';
import { useFreshErrors } from '../use-fresh-errors.ts';
import { FieldRow } from './field-row.tsx';
import { StepFields } from './step-fields.tsx';

const ways = [
  { value: 'minutesPer100', label: 'Minutes per 100', detail: 'one figure for all of it' },
  { value: 'steps', label: 'Step by step', detail: 'setup, seconds and rejects of each' },
];

/** How long it takes, and how many fail: one figure to begin with, or step by step. */
export function WorkFields() {
  const inSteps = useFreshErrors('definition.work', 'kind') === 'steps';
  return (
    <>
      <RadioCards name="definition.work.kind" label="Work" cards={ways} across />
      {inSteps ? (
        <StepFields />
      ) : (
        <FieldRow>
          <DecimalField
            name="definition.work.minutes"
            label="Minutes per 100"
            unit="min"
            help="hands on the work, from cutting to packing"
          />
          <DecimalField
            name="definition.work.rejectPercent"
            label="Rejects"
            unit="%"
            help="until your own runs say otherwise"
          />
        </FieldRow>
      )}
    </>
  );
}
