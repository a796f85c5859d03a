import { useWatch } from 'react-hook-form';
import { DecimalField } from '../../../components/decimal-field.tsx';
import { More } from '../../../components/more.tsx';
import { NumberField } from '../../../components/number-field.tsx';
import { SelectField } from '../../../components/select-field.tsx';
import { FieldRow } from './field-row.tsx';

interface Work {
  kind?: string;
  steps?: { name?: string }[];
}

/** From when a line of hardware is needed, and how much of it is spoiled. */
export function MoreOfHardware({ at }: { at: number }) {
  const line = `definition.hardware.${at}`;
  const [work, fromStep, lossPercent, layers] = useWatch({
    name: ['definition.work', `${line}.fromStep`, `${line}.lossPercent`, `${line}.layers`],
  }) as [Work, unknown, unknown, unknown];
  const choices = stepChoices(work);
  const notes = [
    choices.find(({ value }) => value === fromStep)?.label,
    lossPercent ? `${String(lossPercent)} % spoiled` : undefined,
    layers ? `through ${String(layers)} layers` : undefined,
  ];
  return (
    <More
      word="More"
      note={notes.filter(Boolean).join(', ')}
      names={[`${line}.fromStep`, `${line}.lossPercent`, `${line}.layers`]}
    >
      <FieldRow>
        <div className="col-span-2 min-w-56 grow">
          <SelectField
            key={choices.length}
            name={`${line}.fromStep`}
            label="Needed for"
            placeholder="only the pieces ordered"
            choices={choices}
            help="Pieces that fail later have used it up."
          />
        </div>
        <DecimalField
          name={`${line}.lossPercent`}
          label="Spoiled"
          unit="%"
          optional
          help="of the hardware itself"
        />
        <NumberField
          name={`${line}.layers`}
          label="Through"
          unit="layers"
          optional
          help="of the leather; two where it is empty"
        />
      </FieldRow>
    </More>
  );
}

function stepChoices(work: Work) {
  if (work.kind !== 'steps') return [{ value: 0, label: 'every piece that is cut' }];
  return (work.steps ?? []).map(({ name = '' }, step) => ({
    value: step,
    label: `every piece that reaches step ${step + 1} ${name}`.trim(),
  }));
}
