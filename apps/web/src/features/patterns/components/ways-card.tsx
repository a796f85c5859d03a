import type { Pattern } from '@hidewright/contract';
import { FormProvider, useForm, useWatch } from 'react-hook-form';
import { Card } from '../../../components/card.tsx';
import { NumberField } from '../../../components/number-field.tsx';
import { SelectField } from '../../../components/select-field.tsx';
import type { Steps } from '../ways.ts';
import { FieldRow } from './field-row.tsx';
import { WaysTable } from './ways-table.tsx';

const hands = [
  { value: 'one', label: 'one pair of hands' },
  { value: 'each', label: 'somebody at each step' },
];

/** What it costs to make pieces one by one, step by step, or in batches between; nothing of it is kept. */
export function WaysCard({ pattern }: { pattern: Pattern }) {
  const { work } = pattern.definition;
  if (work.kind !== 'steps' || work.steps.length < 2) return null;
  return (
    <Card>
      <details>
        <summary className="rounded py-1 text-lg font-semibold">
          One at a time or in batches?
        </summary>
        <Ways steps={work.steps} perContainer={pattern.layout.pieces} />
      </details>
    </Card>
  );
}

function Ways({ steps, perContainer }: { steps: Steps; perContainer: number }) {
  const form = useForm({
    defaultValues: {
      pieces: 50,
      transfer: Math.max(perContainer, 2),
      handlingSeconds: 12,
      hands: 'one',
    },
  });
  const asked = useWatch({ control: form.control });
  return (
    <FormProvider {...form}>
      <div className="mt-3 space-y-4">
        <FieldRow>
          <NumberField name="pieces" label="Run of" unit="pieces" />
          <NumberField name="transfer" label="Batches of" unit="pieces" />
          <NumberField
            name="handlingSeconds"
            label="Handling"
            unit="s"
            help="to put a batch down and take it up again"
          />
          <div className="col-span-2 min-w-56">
            <SelectField name="hands" label="Hands" choices={hands} />
          </div>
        </FieldRow>
        <WaysTable steps={steps} perContainer={perContainer} asked={asked} />
      </div>
    </FormProvider>
  );
}
