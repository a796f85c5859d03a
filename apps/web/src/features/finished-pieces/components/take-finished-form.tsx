import { takeFinished, type FinishedPiece } from '@hidewright/contract';
import { Form } from '../../../components/form.tsx';
import { NumberField } from '../../../components/number-field.tsx';
import { RadioCards } from '../../../components/radio-cards.tsx';
import { TextField } from '../../../components/text-field.tsx';
import { say } from '../../../components/toast.ts';
import { countText } from '../../../lib/formatting.ts';
import { movedWords } from '../finished-words.ts';
import { useTakeFinished } from '../finished-pieces.mutations.ts';

const ways = [
  { value: 'sold', label: 'Sold over the counter', detail: 'paid on the spot, no invoice' },
  { value: 'given', label: 'Given away' },
  { value: 'spoiled', label: 'Spoiled' },
];

/** Takes pieces from the shelf, with a word on what became of them. */
export function TakeFinishedForm({ piece }: { piece: FinishedPiece }) {
  const take = useTakeFinished();
  return (
    <Form
      schema={takeFinished.body}
      defaults={{ as: 'sold', quantity: '' as unknown as number, reason: '' }}
      submitWord="Take them"
      submitSize="bench"
      again
      onSend={async (body) => {
        const now = await take.mutateAsync({ params: { id: piece.id }, body });
        say(`${countText(body.quantity)} ${movedWords[body.as]}, ${countText(now.onHand)} left.`);
      }}
    >
      <RadioCards name="as" label="What becomes of them" cards={ways} />
      <NumberField name="quantity" label="How many" unit="pieces" />
      <TextField
        name="reason"
        label="To whom, or why"
        help="This writes no invoice and enters no money in the books."
      />
    </Form>
  );
}
