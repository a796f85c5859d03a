import { receiveDelivery, type PurchaseOrder, type ReplyOf } from '@hidewright/contract';
import { Checkbox } from '../../../components/checkbox.tsx';
import { DayField } from '../../../components/day-field.tsx';
import { Form } from '../../../components/form.tsx';
import type { Choice } from '../../../components/select-field.tsx';
import { useWorkshop } from '../../../lib/workshop.tsx';
import { useReceiveDelivery } from '../stock.mutations.ts';
import type { TypedDelivery } from '../typed-delivery.ts';
import { ReceivedHardwareList } from './received-hardware-list.tsx';
import { ReceivedLotList } from './received-lot-list.tsx';

interface ReceiveFormProps {
  order: PurchaseOrder | undefined;
  defaults: TypedDelivery;
  leathers: readonly Choice[];
  hardware: readonly Choice[];
  /** Whether the person may say what it cost. */
  mayPrice: boolean;
  onReceived: (received: ReplyOf<typeof receiveDelivery>) => void;
}

/** What a supplier brought, made for one thumb: a lot a card, counts that are already there. */
export function ReceiveForm(props: ReceiveFormProps) {
  const { order, defaults, leathers, hardware, mayPrice, onReceived } = props;
  const send = useReceiveDelivery();
  const { today } = useWorkshop();
  const lines = order?.lines ?? [];
  return (
    <Form
      schema={receiveDelivery.body}
      defaults={defaults}
      submitWord="Put it on the rack"
      submitSize="bench"
      draftKey={`receive-${order?.id ?? 'without-order'}`}
      onSend={async (body) => onReceived(await send.mutateAsync({ body }))}
    >
      <ReceivedLotList lines={lines} leathers={leathers} mayPrice={mayPrice} />
      <ReceivedHardwareList lines={lines} hardware={hardware} mayPrice={mayPrice} />
      {order && (
        <Checkbox
          name="nothingMore"
          label={`Nothing more is to come of ${order.number}`}
          help="Closes the order although something of it is missing."
        />
      )}
      <DayField name="receivedOn" label="Came on" max={today} />
    </Form>
  );
}
