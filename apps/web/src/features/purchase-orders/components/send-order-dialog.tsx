import { sendPurchaseOrder, type PurchaseOrder } from '@hidewright/contract';
import { Dialog } from '../../../components/dialog.tsx';
import { Form } from '../../../components/form.tsx';
import { RadioCards } from '../../../components/radio-cards.tsx';
import { say } from '../../../components/toast.ts';
import { dayText } from '../../../lib/formatting.ts';
import { useWorkshop } from '../../../lib/workshop.tsx';
import { useSendPurchaseOrder } from '../purchase-orders.mutations.ts';
import { lotsOf } from '../service-words.ts';
import { OrderRemarksNotice } from './order-remarks-notice.tsx';

interface SendOrderDialogProps {
  order: PurchaseOrder;
  open: boolean;
  onOpenChange: (open: boolean) => void;
}

export function SendOrderDialog({ order, open, onOpenChange }: SendOrderDialogProps) {
  const send = useSendPurchaseOrder();
  const { today } = useWorkshop();
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
      description={`${lots === '' ? '' : `${lots} goes off the rack with it. `}${awaitedWords(order, today)}Once it is sent it cannot be changed; until something has come it can be cancelled.`}
    >
      <OrderRemarksNotice order={order} />
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

/** A day that was chosen and is over by now is worked out anew when the order is sent. */
function awaitedWords({ expectedOn, arrivesOn }: PurchaseOrder, today: string): string {
  if (arrivesOn === null) return '';
  const awaited = `It is awaited ${dayText(arrivesOn, today)}`;
  return expectedOn === null || expectedOn === arrivesOn
    ? `${awaited}. `
    : `${awaited}, as ${dayText(expectedOn, today)}, the day on it, is over. `;
}
