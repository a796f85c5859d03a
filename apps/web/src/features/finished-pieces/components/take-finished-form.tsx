import { takeFinished, type FinishedPiece } from '@hidewright/contract';
import { Form } from '../../../components/form.tsx';
import { NumberField } from '../../../components/number-field.tsx';
import { RadioCards } from '../../../components/radio-cards.tsx';
import { TextField } from '../../../components/text-field.tsx';
import { say } from '../../../components/toast.ts';
import { countText } from '../../../lib/formatting.ts';
import { movedWords } from '../finished-words.ts';
import { useTakeFinished } from '../finished-pieces.mutations.ts';

/** Pieces with a customer's mark go to that customer alone, whom the choices name. */
const waysOf = ({ customerName }: FinishedPiece) => {
  const alone =
    customerName === null ? [] : [`to ${customerName} alone, since they bear that mark`];
  return [
    {
      value: 'sold',
      label: 'Sold over the counter',
      detail: [...alone, 'paid on the spot, no invoice'].join('; '),
    },
    { value: 'given', label: 'Given away', detail: alone[0] },
    { value: 'spoiled', label: 'Spoiled' },
  ];
};

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
        const customerId = body.as === 'spoiled' ? null : piece.customerId;
        const taken = { ...body, customerId };
        const now = await take.mutateAsync({ params: { id: piece.id }, body: taken });
        say(`${countText(body.quantity)} ${movedWords[body.as]}, ${countText(now.onHand)} left.`);
      }}
    >
      <RadioCards name="as" label="What becomes of them" cards={waysOf(piece)} />
      <NumberField name="quantity" label="How many" unit="pieces" />
      <TextField
        name="reason"
        label="To whom, or why"
        help="This writes no invoice and enters no money in the books."
      />
    </Form>
  );
}
