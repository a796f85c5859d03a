import type { PurchaseOrder } from '@hidewright/contract';
import { useSuspenseQuery } from '@tanstack/react-query';
import { useLoaderData, type LoaderFunctionArgs } from 'react-router-dom';
import { Card } from '../../../components/card.tsx';
import { PageTitle } from '../../../components/page-title.tsx';
import { RouteError } from '../../../components/route-error.tsx';
import { OrderActions } from '../../../features/purchase-orders/components/order-actions.tsx';
import { PurchaseLinesTable } from '../../../features/purchase-orders/components/purchase-lines-table.tsx';
import { PurchaseOrderTicket } from '../../../features/purchase-orders/components/purchase-order-ticket.tsx';
import { purchaseOrderQuery } from '../../../features/purchase-orders/purchase-orders.queries.ts';
import { queryClient } from '../../../lib/query-client.ts';
import { useRole } from './use-role.ts';

export async function loader({ params }: LoaderFunctionArgs) {
  return queryClient.ensureQueryData(purchaseOrderQuery(Number(params['id'])));
}

export function Component() {
  const { id } = useLoaderData<PurchaseOrder>();
  const { isOwner, handlesStock } = useRole();
  const { data: order } = useSuspenseQuery(purchaseOrderQuery(id));
  return (
    <div className="space-y-5">
      <PageTitle>{`${order.number}, ${order.supplierName}`}</PageTitle>
      <PurchaseOrderTicket
        order={order}
        actions={<OrderActions order={order} isOwner={isOwner} mayReceive={handlesStock} />}
      />
      <Card title="What is ordered">
        <PurchaseLinesTable order={order} />
      </Card>
      {order.note !== '' && (
        <Card title="Note to the supplier">
          <p className="max-w-prose whitespace-pre-line">{order.note}</p>
        </Card>
      )}
    </div>
  );
}

export const ErrorBoundary = RouteError;
