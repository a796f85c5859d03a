import type { PatternDefinition } from '@hidewright/contract';
import { useWatch } from 'react-hook-form';
import { DecimalField } from '../../../components/decimal-field.tsx';
import { RadioCards } from '../../../components/radio-cards.tsx';
import { countText } from '../../../lib/formatting.ts';
import { useFreshErrors } from '../use-fresh-errors.ts';
import { FieldRow } from './field-row.tsx';
import { PracticeFields } from './practice-fields.tsx';
import { StepFields } from './step-fields.tsx';

const ways = [
  { value: 'minutesPer100', label: 'Minutes per 100', detail: 'one figure for all of it' },
  { value: 'steps', label: 'Step by step', detail: 'setup, seconds and rejects of each' },
];

/** How long it takes, and how many fail: one figure to begin with, or step by step. */
export function WorkFields() {
  const inSteps = useFreshErrors('definition.work', 'kind') === 'steps';
  const behind = useBehindRejects();
  return (
    <>
      <RadioCards name="definition.work.kind" label="Work" cards={ways} across />
      {inSteps ? (
        <>
          <StepFields />
          {behind && <p className="text-sm text-ink-soft">Rejects {behind}</p>}
        </>
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
            help={behind ?? 'until your own runs say otherwise'}
          />
        </FieldRow>
      )}
      <PracticeFields />
    </>
  );
}

/** The pieces of past runs behind the rejects, which rejects by hand do without. */
function useBehindRejects(): string | undefined {
  const history = useWatch({ name: 'definition.history' }) as PatternDefinition['history'];
  if (!history) return undefined;
  const pieces = `${countText(history.good)} good of ${countText(history.total)}`;
  return `from your own runs, ${pieces}; rejects by hand leave those pieces out of the cut count`;
}
