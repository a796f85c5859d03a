import { readPattern, type Pattern } from '@hidewright/contract';
import { useQueryClient } from '@tanstack/react-query';
import { Form } from '../../../components/form.tsx';
import { call } from '../../../lib/api.ts';
import { useChangePattern } from '../patterns.mutations.ts';
import { patternQuery } from '../patterns.queries.ts';
import { patternForm, sentPattern, typedPattern } from '../typed-pattern.ts';
import { PatternFields } from './pattern-fields.tsx';

interface ChangePatternFormProps {
  pattern: Pattern;
  onChanged: (pattern: Pattern) => void;
}

/** A change becomes a new version; quotes keep the one they were made with. */
export function ChangePatternForm({ pattern, onChanged }: ChangePatternFormProps) {
  const send = useChangePattern();
  const client = useQueryClient();
  const { queryKey } = patternQuery(pattern.id);

  async function reload() {
    const now = await call(readPattern, { params: { id: pattern.id } });
    client.setQueryData(queryKey, now);
    return typedPattern(now);
  }

  return (
    <Form
      schema={patternForm}
      defaults={typedPattern(pattern)}
      submitWord="Keep the change"
      draftKey={`pattern-${pattern.id}`}
      onReload={reload}
      onSend={async (typed) => {
        const ifMatch = client.getQueryData<Pattern>(queryKey)?.version ?? pattern.version;
        onChanged(
          await send.mutateAsync({ params: { id: pattern.id }, body: sentPattern(typed), ifMatch }),
        );
      }}
    >
      <PatternFields />
    </Form>
  );
}
