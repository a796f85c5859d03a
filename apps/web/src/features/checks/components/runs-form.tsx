import { checkRuns, type BodyInputOf, type RunsCheck } from '@hidewright/contract';
import { Form } from '../../../components/form.tsx';
import { useCheckRuns } from '../checks.mutations.ts';
import { RunFields } from './run-fields.tsx';

export type AskedRuns = BodyInputOf<typeof checkRuns>['runs'];

interface RunsFormProps {
  onChecked: (asked: AskedRuns, check: RunsCheck) => void;
}

/** Which runs, how many and by when. */
export function RunsForm({ onChecked }: RunsFormProps) {
  const send = useCheckRuns();
  return (
    <Form
      schema={checkRuns.body}
      defaults={{ runs: [{ patternId: null }] }}
      submitWord="Can we make them?"
      submitSize="bench"
      draftKey="bench-checks"
      onSend={async (body) => onChecked(body.runs, await send.mutateAsync({ body }))}
    >
      <RunFields />
    </Form>
  );
}
