import type { Supplier } from '@hidewright/contract';
import { useInfiniteQuery, useSuspenseQuery } from '@tanstack/react-query';
import { useLoaderData, type LoaderFunctionArgs } from 'react-router-dom';
import { Card } from '../../../components/card.tsx';
import { EmptyState } from '../../../components/empty-state.tsx';
import { LinkButton } from '../../../components/link-button.tsx';
import { PageHeader } from '../../../components/page-header.tsx';
import { RouteError } from '../../../components/route-error.tsx';
import { ShowEarlier } from '../../../components/show-earlier.tsx';
import { PurchaseOrdersTable } from '../../../features/purchase-orders/components/purchase-orders-table.tsx';
import { purchaseOrdersQuery } from '../../../features/purchase-orders/purchase-orders.queries.ts';
import { SoldList } from '../../../features/supplier-offers/components/sold-list.tsx';
import { supplierOffersQuery } from '../../../lib/supplier-offers.queries.ts';
import { ChangeSupplierForm } from '../../../features/suppliers/components/change-supplier-form.tsx';
import { SupplierFacts } from '../../../features/suppliers/components/supplier-facts.tsx';
import { supplierQuery } from '../../../features/suppliers/suppliers.queries.ts';
import { queryClient } from '../../../lib/query-client.ts';
import { useRole } from './use-role.ts';

export async function loader({ params }: LoaderFunctionArgs) {
  const id = Number(params['id']);
  const [supplier] = await Promise.all([
    queryClient.ensureQueryData(supplierQuery(id)),
    queryClient.ensureQueryData(supplierOffersQuery({ supplierId: id })),
    queryClient.ensureInfiniteQueryData(purchaseOrdersQuery({ supplierId: id })),
  ]);
  return supplier;
}

export function Component() {
  const { id } = useLoaderData<Supplier>();
  const { isOwner } = useRole();
  const { data: supplier } = useSuspenseQuery(supplierQuery(id));
  const orders = useInfiniteQuery(purchaseOrdersQuery({ supplierId: id }));
  const order = isOwner ? (
    <LinkButton to={`/stockroom/purchase-orders/new?supplier=${id}`} tone="primary">
      New purchase order
    </LinkButton>
  ) : undefined;
  return (
    <>
      <PageHeader title={supplier.name} action={order} />
      <div className="grid items-start gap-5 xl:grid-cols-[minmax(0,24rem)_minmax(0,1fr)]">
        <Card title="How to reach them">
          {isOwner ? (
            <ChangeSupplierForm key={id} supplier={supplier} />
          ) : (
            <SupplierFacts supplier={supplier} />
          )}
        </Card>
        <div className="grid gap-5">
          <SoldList supplierId={id} />
          <Card title="Orders to them">
            <PurchaseOrdersTable
              toOneSupplier
              rows={orders.data?.pages.flatMap((page) => page.items) ?? []}
              empty={<EmptyState title="Nothing was ordered from them yet." action={order} />}
              after={<ShowEarlier pages={orders} what="orders" />}
            />
          </Card>
        </div>
      </div>
    </>
  );
}

export const ErrorBoundary = RouteError;
