import { movePromisedDay, type Order } from '@hidewright/contract';
import { useQuery, useQueryClient } from '@tanstack/react-query';
import { useState } from 'react';
import { Button } from '../../../components/button.tsx';
import { DayField } from '../../../components/day-field.tsx';
import { Dialog } from '../../../components/dialog.tsx';
import { Form } from '../../../components/form.tsx';
import { Skeleton } from '../../../components/loading.tsx';
import { Notice } from '../../../components/notice.tsx';
import { TextField } from '../../../components/text-field.tsx';
import { say } from '../../../components/toast.ts';
import { dayText } from '../../../lib/formatting.ts';
import { useWorkshop } from '../../../lib/workshop.tsx';
import { useMovePromisedDay } from '../orders.mutations.ts';
import { orderQuery, promiseQuery } from '../orders.queries.ts';
import { BenchAnswer } from './bench-answer.tsx';
import { TellCustomerFields } from './tell-customer-fields.tsx';

/** Promises an order for another day, after the bench was asked. */
export function MoveDay({ order }: { order: Order }) {
  const { today } = useWorkshop();
  const [open, setOpen] = useState(false);
  return (
    <>
      <Button onClick={() => setOpen(true)}>Move the day</Button>
      <Dialog
        open={open}
        onOpenChange={setOpen}
        title={`Move the promised day of ${order.number}`}
        description={`It is promised to be packed by ${dayText(order.promisedOn, today)}. That day is kept with the order.`}
      >
        {open && <MoveForm order={order} onDone={() => setOpen(false)} />}
      </Dialog>
    </>
  );
}

function MoveForm({ order, onDone }: { order: Order; onDone: () => void }) {
  const { today } = useWorkshop();
  const client = useQueryClient();
  const { mutateAsync } = useMovePromisedDay();
  const first = order.promisedOn < today ? today : order.promisedOn;
  const { data: now, error } = useQuery(promiseQuery(order.id, first));
  if (error) return <Notice tone="danger">{error.message}</Notice>;
  if (!now) return <Skeleton className="h-40" />;
  const { queryKey } = orderQuery(order.id);
  return (
    <Form
      schema={movePromisedDay.body}
      defaults={{
        promisedOn: first,
        why: '',
        tellCustomer: now.cannotMail === null,
        word: '',
      }}
      submitWord="Promise this day"
      actions={<Button onClick={onDone}>Leave it</Button>}
      onReload={async () => {
        await client.refetchQueries({ queryKey, exact: true });
        return { promisedOn: first, why: '', tellCustomer: now.cannotMail === null, word: '' };
      }}
      onSend={async (body) => {
        const ifMatch = client.getQueryData<Order>(queryKey)?.version ?? order.version;
        const moved = await mutateAsync({ params: { id: order.id }, body, ifMatch });
        onDone();
        say(`${order.number} is promised for ${dayText(moved.promisedOn, today)}.`);
      }}
    >
      <DayField name="promisedOn" label="Packed by" min={today} />
      <BenchAnswer order={order} />
      <TextField
        name="why"
        label="Why"
        help="Kept with the order; the customer does not read it."
      />
      <TellCustomerFields customerName={order.customerName} cannotMail={now.cannotMail} />
    </Form>
  );
}
