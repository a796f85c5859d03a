import { takeFinished, type FinishedPiece } from '@hidewright/contract';
import { Form } from '../../../components/form.tsx';
import { NumberField } from '../../../components/number-field.tsx';
import { RadioCards } from '../../../components/radio-cards.tsx';
import { TextField } from '../../../components/text-field.tsx';
import { say } from '../../../components/toast.ts';
import { countText } from '../../../lib/formatting.ts';
import { movedWords } from '../finished-words.ts';
import { useTakeFinished } from '../finished-pieces.mutations.ts';

const waysOf = ({ customerName }: FinishedPiece) => [
  soldTo(customerName),
  { value: 'given', label: 'Given away' },
  { value: 'spoiled', label: 'Spoiled' },
];

/** Pieces with a customer's mark are sold to that customer, whom the choice names. */
const soldTo = (customerName: string | null) =>
  customerName === null
    ? { value: 'sold', label: 'Sold over the counter', detail: 'paid on the spot, no invoice' }
    : {
        value: 'sold',
        label: `Sold over the counter to ${customerName}`,
        detail: 'to nobody else, since they bear that mark; paid on the spot, no invoice',
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
        const customerId = body.as === 'sold' ? piece.customerId : null;
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
