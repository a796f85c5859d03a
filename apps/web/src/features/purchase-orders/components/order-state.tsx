import type { PurchaseOrder } from '@hidewright/contract';
import { StateMark } from '../../../components/state-mark.tsx';
import { useWorkshop } from '../../../lib/workshop.tsx';

/** The order's state, and whether it should have been here. */
export function OrderState({ order }: { order: PurchaseOrder }) {
  const { today } = useWorkshop();
  const late = order.awaitedOn !== null && order.awaitedOn < today;
  return (
    <span className="inline-flex flex-wrap gap-1.5">
      <StateMark state={order.state} />
      {late && <StateMark state="late" />}
    </span>
  );
}
