import { sendPurchaseOrder, type PurchaseOrder } from '@hidewright/contract';
import { Dialog } from '../../../components/dialog.tsx';
import { Form } from '../../../components/form.tsx';
import { RadioCards } from '../../../components/radio-cards.tsx';
import { say } from '../../../components/toast.ts';
import { useSendPurchaseOrder } from '../purchase-orders.mutations.ts';
import { lotsOf } from '../service-words.ts';

interface SendOrderDialogProps {
  order: PurchaseOrder;
  open: boolean;
  onOpenChange: (open: boolean) => void;
}

export function SendOrderDialog({ order, open, onOpenChange }: SendOrderDialogProps) {
  const send = useSendPurchaseOrder();
  const { supplierEmail } = order;
  const lots = lotsOf(order);
  const cards = [
    ...(supplierEmail === ''
      ? []
      : [{ value: 'mail', label: 'By e-mail', detail: `to ${supplierEmail}, with the PDF` }]),
    {
      value: 'hand',
      label: 'By hand',
      detail: 'by telephone, in their shop, or with the PDF: I have done it',
    },
  ];
  return (
    <Dialog
      open={open}
      onOpenChange={onOpenChange}
      title={`Send ${order.number} to ${order.supplierName}`}
      description={`${lots === '' ? '' : `${lots} goes off the rack with it. `}Once it is sent it cannot be changed; until something has come it can be cancelled.`}
    >
      <Form
        schema={sendPurchaseOrder.body}
        defaults={{ by: supplierEmail === '' ? 'hand' : 'mail' }}
        submitWord="Send it"
        onSend={async (body) => {
          const sent = await send.mutateAsync({ params: { id: order.id }, body });
          onOpenChange(false);
          say(`${sent.number} is sent.`);
        }}
      >
        <RadioCards name="by" label="How" cards={cards} />
      </Form>
    </Dialog>
  );
}
