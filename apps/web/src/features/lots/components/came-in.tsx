import type { LotOrigin } from '@hidewright/contract';
import { TextLink } from '../../../components/text-link.tsx';
import { dayText } from '../../../lib/formatting.ts';
import { useWorkshop } from '../../../lib/workshop.tsx';

interface CameInProps {
  origin: LotOrigin;
  /** Whether the person may look at purchase orders. */
  mayOpenOrders: boolean;
}

/** received Mon 5 Oct from Oldbeck Tannery on PO-0007, their lot B 77 */
export function CameIn({ origin, mayOpenOrders }: CameInProps) {
  const { today } = useWorkshop();
  const { receivedOn, supplierName, purchaseOrderId, purchaseOrderNumber, supplierLot } = origin;
  return (
    <>
      received {dayText(receivedOn, today)}
      {supplierName !== null && ` from ${supplierName}`}
      {purchaseOrderId !== null && ' on '}
      {purchaseOrderId !== null &&
        (mayOpenOrders ? (
          <TextLink
            className="whitespace-nowrap"
            to={`/stockroom/purchase-orders/${purchaseOrderId}`}
          >
            {purchaseOrderNumber}
          </TextLink>
        ) : (
          purchaseOrderNumber
        ))}
      {supplierLot !== '' && `, their lot ${supplierLot}`}
    </>
  );
}
