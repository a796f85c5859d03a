import { addImpressions, type ToolReply } from '@hidewright/contract';
import { Form } from '../../../components/form.tsx';
import { NumberField } from '../../../components/number-field.tsx';
import { TextField } from '../../../components/text-field.tsx';
import { say } from '../../../components/toast.ts';
import { useAddImpressions } from '../tools.mutations.ts';
import { toolTitle, usesWord, wearText } from '../tool-words.ts';

/** Counts what was done outside a job, such as trial strikes, or takes back what was counted too often. */
export function CountForm({ tool }: { tool: ToolReply }) {
  const send = useAddImpressions();
  return (
    <Form
      schema={addImpressions.body}
      defaults={{ uses: '' as unknown as number, reason: '' }}
      submitWord="Count"
      submitTone="secondary"
      again
      onSend={async (body) => {
        const now = await send.mutateAsync({ params: { id: tool.id }, body });
        say(`${toolTitle(now)}: ${wearText(now)} ${usesWord(now.kind)}.`);
      }}
    >
      <NumberField
        name="uses"
        label="How many"
        unit={usesWord(tool.kind)}
        whenEmpty="text"
        help="with a minus to take back"
      />
      <TextField name="reason" label="Why" help="such as trial strikes" />
    </Form>
  );
}
