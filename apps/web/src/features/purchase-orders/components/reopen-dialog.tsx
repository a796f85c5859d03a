import { reopenPurchaseOrder, type PurchaseLine, type PurchaseOrder } from '@hidewright/contract';
import { DayField } from '../../../components/day-field.tsx';
import { Dialog } from '../../../components/dialog.tsx';
import { Form } from '../../../components/form.tsx';
import { say } from '../../../components/toast.ts';
import { useWorkshop } from '../../../lib/workshop.tsx';
import { useReopenPurchaseOrder } from '../purchase-orders.mutations.ts';

interface ReopenDialogProps {
  order: PurchaseOrder;
  /** Left out, everything of the order that is short. */
  line?: PurchaseLine | undefined;
  onClose: () => void;
}

/** What was closed short comes after all. */
export function ReopenDialog({ order, line, onClose }: ReopenDialogProps) {
  const { today } = useWorkshop();
  const reopen = useReopenPurchaseOrder();
  const what = line === undefined ? 'what is missing' : line.name;
  return (
    <Dialog
      open
      onOpenChange={onClose}
      title={`Await ${what} after all?`}
      description="It is counted on again, and can be received on this order. The supplier is not told."
    >
      <Form
        schema={reopenPurchaseOrder.body}
        defaults={{ lineId: line?.id ?? null, expectedOn: '' }}
        submitWord="Await it"
        onSend={async (body) => {
          const now = await reopen.mutateAsync({ params: { id: order.id }, body });
          onClose();
          say(`${now.number}: ${what} is awaited again.`);
        }}
      >
        <DayField
          name="expectedOn"
          label="Expected"
          min={today}
          help="Empty leaves the day as it was."
        />
      </Form>
    </Dialog>
  );
}
