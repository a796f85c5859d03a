import { closePurchaseLine, type PurchaseLine, type PurchaseOrder } from '@hidewright/contract';
import { Dialog } from '../../../components/dialog.tsx';
import { Form } from '../../../components/form.tsx';
import { TextField } from '../../../components/text-field.tsx';
import { say } from '../../../components/toast.ts';
import { useCloseLine } from '../purchase-orders.mutations.ts';

interface CloseLineDialogProps {
  order: PurchaseOrder;
  line: PurchaseLine;
  onClose: () => void;
}

/** Nothing more of one line comes; the others are awaited as before. */
export function CloseLineDialog({ order, line, onClose }: CloseLineDialogProps) {
  const close = useCloseLine();
  return (
    <Dialog
      open
      onOpenChange={onClose}
      title={line.service ? `Call it off: ${line.name}?` : `Nothing more of ${line.name}?`}
      description={
        line.service
          ? `What is out is on ${line.service.lotTag} again, at what it had cost. The supplier is not told.`
          : 'What is missing of it counts as short, and nothing is counted on any more. The supplier is not told.'
      }
    >
      <Form
        schema={closePurchaseLine.body}
        defaults={{ reason: '' }}
        submitWord={line.service ? 'Put it back on its lot' : 'Nothing more comes'}
        onSend={async (body) => {
          const now = await close.mutateAsync({ params: { id: order.id, lineId: line.id }, body });
          onClose();
          if (line.service) say(`It is on ${line.service.lotTag} again.`);
          else
            say(
              now.state === 'received'
                ? `${now.number} is received: nothing more of it is awaited.`
                : `${line.name} is closed short.`,
            );
        }}
      >
        <TextField name="reason" label="Why" help="Such as sold out at the supplier." />
      </Form>
    </Dialog>
  );
}
