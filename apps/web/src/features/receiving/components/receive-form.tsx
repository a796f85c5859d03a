import { receiveDelivery, type PurchaseOrder, type ReplyOf } from '@hidewright/contract';
import { useState } from 'react';
import { Checkbox } from '../../../components/checkbox.tsx';
import { DayField } from '../../../components/day-field.tsx';
import { Form } from '../../../components/form.tsx';
import type { Choice } from '../../../components/select-field.tsx';
import { ApiProblem } from '../../../lib/api-problem.ts';
import { useWorkshop } from '../../../lib/workshop.tsx';
import { useReceiveDelivery } from '../receiving.mutations.ts';
import type { TypedDelivery } from '../typed-delivery.ts';
import { CarriageFields } from './carriage-fields.tsx';
import { LookAgain } from './look-again.tsx';
import { ReceivedHardwareList } from './received-hardware-list.tsx';
import { ReceivedLotList } from './received-lot-list.tsx';

interface ReceiveFormProps {
  order: PurchaseOrder | undefined;
  draftKey: string;
  defaults: TypedDelivery;
  leathers: readonly Choice[];
  hardware: readonly Choice[];
  /** The hardware that customers bring, which costs nothing. */
  fromCustomer: readonly number[];
  /** How far a side may miss its mark, in per cent. */
  tolerancePercent: string;
  /** Whether the person may say what it cost. */
  mayPrice: boolean;
  onReceived: (received: ReplyOf<typeof receiveDelivery>) => void;
  /** Reads the order again, after somebody else received of it. */
  onLookAgain: () => Promise<PurchaseOrder | undefined>;
}

/** What a supplier brought, made for one thumb: a lot a card, counts that are already there. */
export function ReceiveForm(props: ReceiveFormProps) {
  const { order, defaults, leathers, hardware, tolerancePercent, mayPrice } = props;
  const send = useReceiveDelivery();
  const { today } = useWorkshop();
  const [beaten, setBeaten] = useState(false);
  const lines = order?.lines ?? [];
  const hardwareOnly = lines.length > 0 && lines.every((line) => line.of === 'hardware');

  async function receive(body: TypedDelivery) {
    setBeaten(false);
    try {
      props.onReceived(await send.mutateAsync({ body }));
    } catch (error) {
      const isBeaten = error instanceof ApiProblem && error.allowed.includes('look again');
      setBeaten(isBeaten);
      // What is still to come stands beside each line, so it is read again; where it cannot be, the answer still stands.
      if (isBeaten) await props.onLookAgain().catch(() => undefined);
      throw error;
    }
  }

  const lotList = (
    <ReceivedLotList
      key="lots"
      lines={lines}
      leathers={leathers}
      tolerancePercent={tolerancePercent}
      mayPrice={mayPrice}
    />
  );
  const hardwareList = (
    <ReceivedHardwareList
      key="hardware"
      lines={lines}
      hardware={hardware}
      fromCustomer={props.fromCustomer}
      mayPrice={mayPrice}
    />
  );

  return (
    <Form
      schema={receiveDelivery.body}
      defaults={defaults}
      submitWord="Put it on the rack"
      submitSize="bench"
      draftKey={props.draftKey}
      onSend={receive}
    >
      {beaten && <LookAgain onLookAgain={props.onLookAgain} onLooked={() => setBeaten(false)} />}
      {hardwareOnly ? [hardwareList, lotList] : [lotList, hardwareList]}
      {order && (
        <Checkbox
          name="nothingMore"
          label={`Nothing more is to come of ${order.number}`}
          help="Closes the order although something of it is missing."
        />
      )}
      <DayField name="receivedOn" label="Came on" max={today} />
      {mayPrice && <CarriageFields />}
    </Form>
  );
}
