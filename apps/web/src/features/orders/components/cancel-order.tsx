import { cancelOrder, type CancellationOutlook, type Order } from '@hidewright/contract';
import { useQuery } from '@tanstack/react-query';
import { useState } from 'react';
import { Button } from '../../../components/button.tsx';
import { Dialog } from '../../../components/dialog.tsx';
import { Form } from '../../../components/form.tsx';
import { Skeleton } from '../../../components/loading.tsx';
import { Notice } from '../../../components/notice.tsx';
import { TextField } from '../../../components/text-field.tsx';
import { TextLink } from '../../../components/text-link.tsx';
import { say } from '../../../components/toast.ts';
import { useCancelOrder } from '../orders.mutations.ts';
import { cancellationQuery } from '../orders.queries.ts';
import { CancellationEffects } from './cancellation-effects.tsx';
import { TellCustomerFields } from './tell-customer-fields.tsx';

/** Calls an order off for good, after what that does was read. */
export function CancelOrder({ order }: { order: Order }) {
  const [open, setOpen] = useState(false);
  return (
    <>
      <Button tone="quiet" onClick={() => setOpen(true)}>
        Cancel the order
      </Button>
      <Dialog
        open={open}
        onOpenChange={setOpen}
        title={`Cancel ${order.number}?`}
        description="It cannot be taken up again: for another run, write another quote."
      >
        {open && <Outlook order={order} onDone={() => setOpen(false)} />}
      </Dialog>
    </>
  );
}

interface OutlookProps {
  order: Order;
  onDone: () => void;
}

function Outlook({ order, onDone }: OutlookProps) {
  const { data: outlook, isError, refetch } = useQuery(cancellationQuery(order.id));
  if (isError)
    return (
      <Notice tone="danger" actions={<Button onClick={() => void refetch()}>Try again</Button>}>
        What it would do could not be read.
      </Notice>
    );
  if (!outlook) return <Skeleton className="h-40" />;
  if (outlook.because !== null)
    return (
      <Notice tone="attention">
        {outlook.because}
        {order.invoice && (
          <>
            {' '}
            <TextLink to={`/books/invoices/${order.invoice.id}`}>Open its invoice</TextLink>
          </>
        )}
      </Notice>
    );
  return (
    <CancelForm order={order} outlook={outlook} onLookAgain={() => refetch()} onDone={onDone} />
  );
}

interface CancelFormProps extends OutlookProps {
  outlook: CancellationOutlook;
  onLookAgain: () => Promise<unknown>;
}

function CancelForm({ order, outlook, onLookAgain, onDone }: CancelFormProps) {
  const { mutateAsync } = useCancelOrder();
  const { seen, cannotMail } = outlook;
  return (
    <Form
      schema={cancelOrder.body}
      defaults={{ why: '', seen, tellCustomer: cannotMail === null, word: '' }}
      submitWord="Cancel the order"
      submitTone="danger"
      actions={<Button onClick={onDone}>Leave it</Button>}
      onSend={async (body) => {
        try {
          await mutateAsync({ params: { id: order.id }, body: { ...body, seen } });
        } catch (error) {
          // Something may have been taken meanwhile: show what it does now.
          await onLookAgain();
          throw error;
        }
        onDone();
        say(`${order.number} is cancelled.`);
      }}
    >
      <CancellationEffects outlook={outlook} job={order.job} />
      <TextField
        name="why"
        label="Why"
        help="Kept with the order; the customer does not read it."
      />
      <TellCustomerFields customerName={order.customerName} cannotMail={cannotMail} />
    </Form>
  );
}
