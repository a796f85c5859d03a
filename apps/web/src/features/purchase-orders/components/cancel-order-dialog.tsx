import { cancelPurchaseOrder, type PurchaseOrder } from '@hidewright/contract';
import { Dialog } from '../../../components/dialog.tsx';
import { Form } from '../../../components/form.tsx';
import { TextField } from '../../../components/text-field.tsx';
import { say } from '../../../components/toast.ts';
import { useCancelPurchaseOrder } from '../purchase-orders.mutations.ts';
import { lotsOf } from '../service-words.ts';

interface CancelOrderDialogProps {
  order: PurchaseOrder;
  open: boolean;
  onOpenChange: (open: boolean) => void;
}

export function CancelOrderDialog({ order, open, onOpenChange }: CancelOrderDialogProps) {
  const cancel = useCancelPurchaseOrder();
  const lots = lotsOf(order);
  return (
    <Dialog
      open={open}
      onOpenChange={onOpenChange}
      title={`Cancel ${order.number}?`}
      description={[
        ...(order.state === 'sent' ? ['The supplier is not told: tell them yourself.'] : []),
        ...(order.state === 'sent' && lots !== '' ? [`What is out of ${lots} is back on it.`] : []),
        'It cannot be taken up again.',
      ].join(' ')}
    >
      <Form
        schema={cancelPurchaseOrder.body}
        defaults={{ reason: '' }}
        submitWord="Cancel the order"
        submitTone="danger"
        onSend={async (body) => {
          const cancelled = await cancel.mutateAsync({ params: { id: order.id }, body });
          onOpenChange(false);
          say(`${cancelled.number} is cancelled.`);
        }}
      >
        <TextField name="reason" label="Why" />
      </Form>
    </Dialog>
  );
}
