import { useWatch } from 'react-hook-form';
import { Checkbox } from '../../../components/checkbox.tsx';
import { DecimalField } from '../../../components/decimal-field.tsx';
import { MoneyField } from '../../../components/money-field.tsx';
import { More } from '../../../components/more.tsx';
import { NumberField } from '../../../components/number-field.tsx';
import { stepNotes } from '../step-notes.ts';
import { FieldRow } from './field-row.tsx';

const parts = ['people', 'unattended', 'shortestWait', 'longestWait', 'pieceRate'];

/** People, waits and piece rate of a step: most steps have none of them. */
export function MoreOfStep({ at }: { at: number }) {
  const step = `definition.work.steps.${at}`;
  const typed = useWatch({ name: step }) as Record<string, unknown> | undefined;
  const per = String(typed?.['per'] ?? 'piece');
  return (
    <More word="More" note={stepNotes(typed ?? {})} names={parts.map((part) => `${step}.${part}`)}>
      <FieldRow>
        <DecimalField
          name={`${step}.shortestWait`}
          label="Lies at least"
          unit="min"
          optional
          help="before the next step: pack bone dry"
        />
        <DecimalField
          name={`${step}.longestWait`}
          label="Lies at most"
          unit="min"
          optional
          help="before the next step: strike while damp"
        />
        <NumberField name={`${step}.people`} label="People" optional help="1, if left empty" />
        <MoneyField
          name={`${step}.pieceRate`}
          label="Paid by the piece"
          per={per}
          optional
          help="in place of by the hour"
        />
      </FieldRow>
      <Checkbox
        name={`${step}.unattended`}
        label="Nobody stands by while it runs"
        help="Setting it up still takes hands."
      />
    </More>
  );
}
