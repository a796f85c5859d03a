import { plateMetals, type ToolReply } from '@hidewright/contract';
import { useQuery } from '@tanstack/react-query';
import { DecimalField } from '../../../components/decimal-field.tsx';
import { LengthField } from '../../../components/length-field.tsx';
import { MoneyField } from '../../../components/money-field.tsx';
import { NumberField } from '../../../components/number-field.tsx';
import { SelectField } from '../../../components/select-field.tsx';
import { TextField } from '../../../components/text-field.tsx';
import { patternChoicesQuery } from '../tools.queries.ts';
import { statesFor, usesWord } from '../tool-words.ts';
import { OwnerFields } from './owner-fields.tsx';

const metals = plateMetals.map((metal) => ({ value: metal, label: metal }));

interface ToolFieldsProps {
  kind: ToolReply['kind'];
  /** The state it is in; a new one, which may leave its number to the program, is in none yet. */
  from?: ToolReply['state'];
}

/** What a cutting die or stamp plate is, cost, and where it lives. */
export function ToolFields({ kind, from }: ToolFieldsProps) {
  const isNew = from === undefined;
  const { data: patterns = [] } = useQuery(patternChoicesQuery());
  const isPlate = kind === 'stamp plate';
  return (
    <>
      <TextField
        name="name"
        label="Name"
        help={isPlate ? 'such as Heron crest' : 'such as Coaster 95 mm'}
      />
      <TextField
        name="number"
        label="Number"
        short
        optional={isNew}
        help={isNew ? 'Left empty it gets the next one.' : undefined}
      />
      {isPlate && (
        <SelectField
          name="metal"
          label="Metal"
          placeholder="Choose a metal"
          whenEmpty="text"
          choices={metals}
          short
        />
      )}
      <MoneyField name="cost" label="Cost" />
      <NumberField
        name="lifeUses"
        label="Expected life"
        unit={usesWord(kind)}
        whenEmpty="text"
        help="by your own experience; it can be changed"
      />
      <TextField
        name="slot"
        label="Slot"
        short
        optional
        help="where it lives on the rack, such as C3"
      />
      <SelectField
        key={`patterns ${patterns.length}`}
        name="patternId"
        label="Pattern"
        optional
        placeholder="For several patterns"
        whenEmpty="null"
        choices={patterns}
      />
      <OwnerFields />
      {isPlate ? <PlateMeasures /> : <DieMeasures />}
      <SelectField
        name="state"
        label="State"
        choices={statesFor(from).map((state) => ({ value: state, label: state }))}
        short
      />
    </>
  );
}

function DieMeasures() {
  return (
    <>
      <NumberField
        name="piecesPerStrike"
        label="Pieces at one strike"
        whenEmpty="text"
        help="more than one where the die holds several"
      />
      <LengthField
        name="ruleThicknessMm"
        label="Thickness of the rule"
        optional
        whenEmpty="null"
        help="how far the steel stands outside the outline; the spacing can be no less"
      />
    </>
  );
}

function PlateMeasures() {
  return (
    <>
      <LengthField
        name="borderMm"
        label="Border"
        optional
        whenEmpty="null"
        help="how far the plate stands out around the outline; the spacing can be no less"
      />
      <DecimalField
        name="reliefAreaMm2"
        label="Relief"
        unit="mm²"
        optional
        whenEmpty="null"
        help="raised area that is pressed in; the engraver can tell"
      />
    </>
  );
}
