import { countFinished, type FinishedPiece } from '@hidewright/contract';
import { Form } from '../../../components/form.tsx';
import { NumberField } from '../../../components/number-field.tsx';
import { TextField } from '../../../components/text-field.tsx';
import { say } from '../../../components/toast.ts';
import { countText } from '../../../lib/formatting.ts';
import { useCountFinished } from '../finished-pieces.mutations.ts';

/** Sets the books to what really lies there. */
export function CountFinishedForm({ piece }: { piece: FinishedPiece }) {
  const count = useCountFinished();
  return (
    <Form
      schema={countFinished.body}
      defaults={{ counted: '' as unknown as number, reason: 'Counted on the shelf' }}
      submitWord="Set it"
      submitSize="bench"
      submitTone="secondary"
      again
      onSend={async (body) => {
        const now = await count.mutateAsync({ params: { id: piece.id }, body });
        say(
          now.onHand === piece.onHand
            ? 'It is as the books say.'
            : `${countText(now.onHand)} are on the shelf now.`,
        );
      }}
    >
      <NumberField name="counted" label="Counted now" unit="pieces" />
      <TextField name="reason" label="Why" />
    </Form>
  );
}
