import { putOnShelf, type FinishedPiece } from '@hidewright/contract';
import { Form } from '../../../components/form.tsx';
import { MoneyField } from '../../../components/money-field.tsx';
import { More } from '../../../components/more.tsx';
import { NumberField } from '../../../components/number-field.tsx';
import { RadioCards } from '../../../components/radio-cards.tsx';
import { SelectField, type Choice } from '../../../components/select-field.tsx';
import { TextField } from '../../../components/text-field.tsx';
import { usePutOnShelf } from '../finished-pieces.mutations.ts';
import { OptionField } from './option-field.tsx';

const sorts = [
  { value: 'good', label: 'Good ones' },
  { value: 'seconds', label: 'Seconds' },
];

interface PutOnShelfFormProps {
  patterns: readonly Choice[];
  /** Left out for who may not see them. */
  customers: readonly Choice[] | undefined;
  isOwner: boolean;
  onPut: (piece: FinishedPiece, quantity: number) => void;
}

/** Pieces that were found, or were there before the program was. */
export function PutOnShelfForm({ patterns, customers, isOwner, onPut }: PutOnShelfFormProps) {
  const put = usePutOnShelf();
  return (
    <Form
      schema={putOnShelf.body}
      defaults={{
        patternId: '' as unknown as number,
        quantity: '' as unknown as number,
        sort: 'good',
        place: '',
        reason: '',
      }}
      submitWord="Put on the shelf"
      submitSize="bench"
      draftKey="put-on-shelf"
      onSend={async (body) => onPut(await put.mutateAsync({ body }), body.quantity)}
    >
      <SelectField
        name="patternId"
        label="Pattern"
        placeholder="Choose a pattern"
        choices={patterns}
      />
      <OptionField />
      <RadioCards name="sort" label="Sort" cards={sorts} across />
      <NumberField name="quantity" label="How many" unit="pieces" />
      <TextField
        name="reason"
        label="Where they come from"
        help="Such as found in a box, or there when the books began."
      />
      <TextField name="place" label="Place" optional help="Such as tray 3, or the shop window." />
      {isOwner && (
        <More word="What they cost, and whose mark they bear" names={['unitCost', 'customerId']}>
          <MoneyField
            name="unitCost"
            label="Each cost to make"
            optional
            whenEmpty="null"
            help="Leather and hardware, no wages. Left empty, what those of their kind cost."
          />
          {customers && (
            <SelectField
              name="customerId"
              label="With the mark of"
              placeholder="nobody"
              whenEmpty="null"
              choices={customers}
              help="Pieces with a mark are offered to that customer alone."
            />
          )}
        </More>
      )}
    </Form>
  );
}
