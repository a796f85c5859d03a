import { plateMetals, toolStates, type ToolReply } from '@hidewright/contract';
import { useQuery } from '@tanstack/react-query';
import { DecimalField } from '../../../components/decimal-field.tsx';
import { LengthField } from '../../../components/length-field.tsx';
import { MoneyField } from '../../../components/money-field.tsx';
import { NumberField } from '../../../components/number-field.tsx';
import { SelectField } from '../../../components/select-field.tsx';
import { TextField } from '../../../components/text-field.tsx';
import { customerChoicesQuery, patternChoicesQuery } from '../tools.queries.ts';
import { usesWord } from '../tool-words.ts';

const metals = plateMetals.map((metal) => ({ value: metal, label: metal }));
const states = toolStates.map((state) => ({ value: state, label: state }));

interface ToolFieldsProps {
  kind: ToolReply['kind'];
  /** A new one may leave its number to the program. */
  isNew?: boolean;
}

/** What a cutting die or stamp plate is, cost, and where it lives. */
export function ToolFields({ kind, isNew = false }: ToolFieldsProps) {
  const { data: patterns = [] } = useQuery(patternChoicesQuery());
  const { data: customers = [] } = useQuery(customerChoicesQuery());
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
      {isPlate && (
        <SelectField
          key={`customers ${customers.length}`}
          name="customerId"
          label="Customer"
          optional
          placeholder="Nobody in particular"
          whenEmpty="null"
          choices={customers}
        />
      )}
      {isPlate ? <PlateMeasures /> : <DieMeasures />}
      <SelectField name="state" label="State" choices={states} short />
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
