import type { Pattern, Workshop } from '@hidewright/contract';
import { Form } from '../../../components/form.tsx';
import { useAddPattern } from '../patterns.mutations.ts';
import { blankPattern, patternForm, sentPattern } from '../typed-pattern.ts';
import { PatternFields } from './pattern-fields.tsx';

interface AddPatternFormProps {
  startingValues: Workshop;
  onAdded: (pattern: Pattern) => void;
}

export function AddPatternForm({ startingValues, onAdded }: AddPatternFormProps) {
  const send = useAddPattern();
  return (
    <Form
      schema={patternForm}
      defaults={blankPattern(startingValues)}
      submitWord="Keep the pattern"
      draftKey="pattern-new"
      onSend={async (typed) => onAdded(await send.mutateAsync({ body: sentPattern(typed) }))}
    >
      <PatternFields />
    </Form>
  );
}
