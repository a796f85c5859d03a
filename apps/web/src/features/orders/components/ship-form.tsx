import { shipOrder, type Order } from '@hidewright/contract';
import { Card } from '../../../components/card.tsx';
import { DayField } from '../../../components/day-field.tsx';
import { Form } from '../../../components/form.tsx';
import { say } from '../../../components/toast.ts';
import { useWorkshop } from '../../../lib/workshop.tsx';
import { useShipOrder } from '../orders.mutations.ts';

/** The packed order leaves the shop. */
export function ShipForm({ order }: { order: Pick<Order, 'id' | 'number'> }) {
  const { today } = useWorkshop();
  const { mutateAsync } = useShipOrder();
  return (
    <Card title="Ship">
      <Form
        schema={shipOrder.body}
        defaults={{ shippedOn: today }}
        onSend={async (body) => {
          await mutateAsync({ params: { id: order.id }, body });
          say(`${order.number} is shipped.`);
        }}
        submitWord="It has left the shop"
      >
        <DayField name="shippedOn" label="Shipped on" max={today} />
      </Form>
    </Card>
  );
}
