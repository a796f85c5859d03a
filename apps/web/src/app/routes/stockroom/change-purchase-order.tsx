import { readPurchaseOrder, type PurchaseOrder } from '@hidewright/contract';
import { useQueryClient, useSuspenseQuery } from '@tanstack/react-query';
import { useLoaderData, useNavigate, type LoaderFunctionArgs } from 'react-router-dom';
import { Card } from '../../../components/card.tsx';
import { PageHeader } from '../../../components/page-header.tsx';
import { RouteError } from '../../../components/route-error.tsx';
import { say } from '../../../components/toast.ts';
import { PurchaseOrderForm } from '../../../features/purchase-orders/components/purchase-order-form.tsx';
import { useChangePurchaseOrder } from '../../../features/purchase-orders/purchase-orders.mutations.ts';
import { purchaseOrderQuery } from '../../../features/purchase-orders/purchase-orders.queries.ts';
import { typedOf } from '../../../features/purchase-orders/typed-order.ts';
import { call } from '../../../lib/api.ts';
import { queryClient } from '../../../lib/query-client.ts';
import { loadOrderBasics, useOrderBasics } from './order-basics.tsx';

export async function loader({ params }: LoaderFunctionArgs) {
  const id = Number(params['id']);
  const [order] = await Promise.all([
    queryClient.ensureQueryData(purchaseOrderQuery(id)),
    loadOrderBasics(),
  ]);
  return order;
}

export function Component() {
  const { id } = useLoaderData<PurchaseOrder>();
  const navigate = useNavigate();
  const change = useChangePurchaseOrder();
  const client = useQueryClient();
  const { data: order } = useSuspenseQuery(purchaseOrderQuery(id));
  const { queryKey } = purchaseOrderQuery(id);
  const place = `/stockroom/purchase-orders/${id}`;

  async function reload() {
    const now = await call(readPurchaseOrder, { params: { id } });
    client.setQueryData(queryKey, now);
    return typedOf(now);
  }

  return (
    <>
      <PageHeader title={`Change ${order.number}`} />
      <Card>
        <PurchaseOrderForm
          {...useOrderBasics()}
          defaults={typedOf(order)}
          draftKey={`purchase-order-${id}`}
          submitWord="Save"
          cancelTo={place}
          onReload={reload}
          onSend={async (body) => {
            const ifMatch = client.getQueryData<PurchaseOrder>(queryKey)?.version ?? order.version;
            const saved = await change.mutateAsync({ params: { id }, body, ifMatch });
            say(`${saved.number} is saved.`);
            void navigate(place);
          }}
        />
      </Card>
    </>
  );
}

export const ErrorBoundary = RouteError;
