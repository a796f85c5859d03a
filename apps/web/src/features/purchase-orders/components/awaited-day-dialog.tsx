import { changeAwaitedDay, type PurchaseLine, type PurchaseOrder } from '@hidewright/contract';
import { DayField } from '../../../components/day-field.tsx';
import { Dialog } from '../../../components/dialog.tsx';
import { Form } from '../../../components/form.tsx';
import { say } from '../../../components/toast.ts';
import { dayText } from '../../../lib/formatting.ts';
import { useWorkshop } from '../../../lib/workshop.tsx';
import { useChangeAwaitedDay } from '../purchase-orders.mutations.ts';

interface AwaitedDayDialogProps {
  order: PurchaseOrder;
  line: PurchaseLine;
  onClose: () => void;
}

/** The supplier names another day for what is still to come. */
export function AwaitedDayDialog({ order, line, onClose }: AwaitedDayDialogProps) {
  const { today } = useWorkshop();
  const change = useChangeAwaitedDay();
  return (
    <Dialog
      open
      onOpenChange={onClose}
      title={`When does the rest of ${line.name} come?`}
      description="The supplier is not told; the sent order stays as it is."
    >
      <Form
        schema={changeAwaitedDay.body}
        defaults={{ expectedOn: line.expectedOn ?? '' }}
        submitWord="Save the day"
        onSend={async (body) => {
          const params = { id: order.id, lineId: line.id };
          await change.mutateAsync({ params, body, ifMatch: order.version });
          onClose();
          say(`${line.name} is awaited ${dayText(body.expectedOn, today)}.`);
        }}
      >
        <DayField name="expectedOn" label="Expected" min={today} />
      </Form>
    </Dialog>
  );
}
