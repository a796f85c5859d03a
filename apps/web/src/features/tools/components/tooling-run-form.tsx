import { readToolingAdvice } from '@hidewright/contract';
import { useQuery } from '@tanstack/react-query';
import { Form } from '../../../components/form.tsx';
import { NumberField } from '../../../components/number-field.tsx';
import { SelectField } from '../../../components/select-field.tsx';
import { customerChoicesQuery, type AskedTooling } from '../tools.queries.ts';

export type TypedRun = Omit<AskedTooling, 'patternId'>;

interface ToolingRunFormProps {
  run: Partial<TypedRun>;
  onRun: (run: TypedRun) => void;
}

/** For whom, how many now, and how often again. */
export function ToolingRunForm({ run, onRun }: ToolingRunFormProps) {
  const { data: customers = [] } = useQuery(customerChoicesQuery());
  return (
    <Form
      schema={readToolingAdvice.query}
      defaults={{ pieces: '', runs: 0, ...run }}
      submitWord="Look"
      onSend={(typed) => {
        onRun(readToolingAdvice.query?.parse(typed) as TypedRun);
        return Promise.resolve();
      }}
    >
      <SelectField
        key={`customers ${customers.length}`}
        name="customerId"
        label="Customer"
        optional
        placeholder="Nobody in particular"
        choices={customers}
        help="whose plate it is"
      />
      <NumberField
        name="pieces"
        label="Pieces to cut"
        whenEmpty="text"
        help="the good ones and those for rejects"
      />
      <NumberField name="runs" label="Repeats expected" help="runs after this one" />
      <NumberField
        name="runPieces"
        label="Pieces in each repeat"
        optional
        help="as many as now, if left empty"
      />
    </Form>
  );
}
