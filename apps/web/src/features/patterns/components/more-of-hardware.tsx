import { useWatch } from 'react-hook-form';
import { DecimalField } from '../../../components/decimal-field.tsx';
import { More } from '../../../components/more.tsx';
import { NumberField } from '../../../components/number-field.tsx';
import { FieldRow } from './field-row.tsx';
import { NeededForField, useStepsToWaitFor } from './needed-for-field.tsx';

/** From when a line of hardware is needed, and how much of it is spoiled. */
export function MoreOfHardware({ at }: { at: number }) {
  const line = `definition.hardware.${at}`;
  const [fromStep, lossPercent, layers] = useWatch({
    name: [`${line}.fromStep`, `${line}.lossPercent`, `${line}.layers`],
  }) as unknown[];
  const choices = useStepsToWaitFor();
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
          <NeededForField name={`${line}.fromStep`} />
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
