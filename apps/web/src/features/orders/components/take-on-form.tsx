import { takeOnOrder, type Order, type RunCheck } from '@hidewright/contract';
import { Checkbox } from '../../../components/checkbox.tsx';
import { DayField } from '../../../components/day-field.tsx';
import { Form } from '../../../components/form.tsx';
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

/** Makes the order, its job and what is held for it, at once; a day is promised. */
export function TakeOnForm({ quoteId, inHandsOn, check, onTakenOn }: TakeOnFormProps) {
  const { today } = useWorkshop();
  const { mutateAsync } = useTakeOnOrder();
  const inHands = inHandsOn === null ? 'The day it leaves the shop.' : `It must be in the customer’s hands on ${dayText(inHandsOn, today)}.`;
  return (
    <Form
      schema={takeOnOrder.body}
      draftKey={`take-on-${quoteId}`}
      defaults={{ quoteId, promisedOn: check.by, awaits: [], evenIfShort: false }}
      onSend={async (body) => onTakenOn(await mutateAsync({ body }))}
      submitWord="Take it on"
    >
      <DayField name="promisedOn" label="Promise it for" min={today} help={inHands} />
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
