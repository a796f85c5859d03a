import type { PurchaseOrder } from '@hidewright/contract';
import { useQuery } from '@tanstack/react-query';
import { Notice } from '../../../components/notice.tsx';
import { supplierOffersQuery } from '../../../lib/supplier-offers.queries.ts';
import { useWorkshop } from '../../../lib/workshop.tsx';
import { orderRemarks } from '../order-remarks.ts';

/**
 * Before a draft is sent: what its supplier does not sell like that, where more costs less or little more, and what has
 * no price.
 */
export function OrderRemarksNotice({ order }: { order: PurchaseOrder }) {
  const workshop = useWorkshop();
  const { data } = useQuery(supplierOffersQuery({ supplierId: order.supplierId }));
  const remarks = orderRemarks(order, data?.items ?? [], workshop);
  if (remarks.length === 0) return null;
  return (
    <Notice tone="attention" className="mb-4" title="Before it is sent:">
      <ul>
        {remarks.map(({ lineId, name, text }) => (
          <li key={lineId}>
            <span className="font-semibold">{name}.</span> {text}
          </li>
        ))}
      </ul>
    </Notice>
  );
}
