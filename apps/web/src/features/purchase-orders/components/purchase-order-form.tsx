import { addPurchaseOrder } from '@hidewright/contract';
import { Form } from '../../../components/form.tsx';
import { DayField } from '../../../components/day-field.tsx';
import { LinkButton } from '../../../components/link-button.tsx';
import { SelectField, type Choice } from '../../../components/select-field.tsx';
import { Stitch } from '../../../components/stitch.tsx';
import { TextArea } from '../../../components/text-area.tsx';
import { useWorkshop } from '../../../lib/workshop.tsx';
import type { Goods, TypedOrder } from '../typed-order.ts';
import { OrderLines } from './order-lines.tsx';

interface PurchaseOrderFormProps {
  defaults: Partial<TypedOrder>;
  suppliers: readonly Choice[];
  leathers: readonly Goods[];
  hardware: readonly Goods[];
  draftKey: string;
  submitWord: string;
  cancelTo: string;
  onSend: (body: TypedOrder) => Promise<unknown>;
  onReload?: () => Promise<TypedOrder>;
}

/** An order to a supplier as it is typed, with what it comes to. */
export function PurchaseOrderForm(props: PurchaseOrderFormProps) {
  const { defaults, suppliers, leathers, hardware, cancelTo, onReload, ...form } = props;
  const { today } = useWorkshop();
  return (
    <Form
      {...form}
      schema={addPurchaseOrder.body}
      defaults={defaults}
      {...(onReload && { onReload })}
      actions={
        <LinkButton to={cancelTo} tone="quiet">
          Leave it
        </LinkButton>
      }
    >
      <SelectField
        name="supplierId"
        label="Supplier"
        placeholder="Choose a supplier"
        choices={suppliers}
      />
      <DayField
        name="expectedOn"
        label="Expected"
        optional
        min={today}
        whenEmpty="null"
        help="Left empty, it is worked out when the order is sent, from how long its slowest line takes."
      />
      <Stitch />
      <OrderLines leathers={leathers} hardware={hardware} />
      <Stitch />
      <TextArea name="note" label="Note to the supplier" rows={3} optional />
    </Form>
  );
}
