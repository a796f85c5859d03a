import { takeOnOrder, type Order, type RunCheck } from '@hidewright/contract';
import { Checkbox } from '../../../components/checkbox.tsx';
import { Form } from '../../../components/form.tsx';
import { Notice } from '../../../components/notice.tsx';
import { dayText } from '../../../lib/formatting.ts';
import { useWorkshop } from '../../../lib/workshop.tsx';
import { useTakeOnOrder } from '../orders.mutations.ts';
import { AwaitsField } from './awaits-field.tsx';

interface TakeOnFormProps {
  quoteId: number;
  inHandsOn: string | null;
  check: RunCheck;
  onTakenOn: (order: Order) => unknown;
}

/** Makes the order, its job and what is held for it, at once; the day that was checked is the day promised. */
export function TakeOnForm({ quoteId, inHandsOn, check, onTakenOn }: TakeOnFormProps) {
  const { today } = useWorkshop();
  const { mutateAsync } = useTakeOnOrder();
  return (
    <Form
      schema={takeOnOrder.body}
      draftKey={`take-on-${quoteId}`}
      defaults={{ quoteId, promisedOn: check.by, awaits: [], evenIfShort: false }}
      onSend={async (body) =>
        onTakenOn(await mutateAsync({ body: { ...body, promisedOn: check.by } }))
      }
      submitWord={`Take it on, packed by ${dayText(check.by, today)}`}
    >
      {inHandsOn !== null && check.by > inHandsOn && (
        <Notice tone="attention">
          The customer needs it in hands on {dayText(inHandsOn, today)}, before that day.
        </Notice>
      )}
      <AwaitsField />
      {!check.yes && (
        <Checkbox
          name="evenIfShort"
          label="Take it on although something is short"
          help="What there is, is held; the rest must be bought."
        />
      )}
    </Form>
  );
}
