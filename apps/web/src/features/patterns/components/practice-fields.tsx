import { DecimalField } from '../../../components/decimal-field.tsx';
import { More } from '../../../components/more.tsx';
import { NumberField } from '../../../components/number-field.tsx';
import { SelectField } from '../../../components/select-field.tsx';
import { learningModels } from '../pattern-words.ts';
import { useFreshErrors } from '../use-fresh-errors.ts';
import { FieldRow } from './field-row.tsx';

const work = 'definition.work';
const models = Object.entries(learningModels).map(([value, label]) => ({ value, label }));

/** Pieces good enough to sell for less, and time that falls with practice. */
export function PracticeFields() {
  const model = useFreshErrors(`${work}.learning`, 'model');
  return (
    <More word="Seconds and practice" names={[`${work}.secondsPercent`, `${work}.learning`]}>
      <DecimalField
        name={`${work}.secondsPercent`}
        label="Seconds"
        unit="%"
        optional
        help="Good enough to sell for less; they are not among the good ones."
      />
      <SelectField
        name={`${work}.learning.model`}
        label="Time falls with practice"
        placeholder="it does not"
        whenEmpty="text"
        choices={models}
        help="What each doubling of the run brings down: the time of each piece, or the average so far."
      />
      {model in learningModels && (
        <FieldRow>
          <DecimalField
            name={`${work}.learning.curvePercent`}
            label="Each doubling leaves"
            unit="%"
            help="of the time; 90 is usual, 100 is no practice"
          />
          <NumberField
            name={`${work}.learning.measuredAt`}
            label="Times are from a run of"
            unit="pieces"
          />
        </FieldRow>
      )}
    </More>
  );
}
