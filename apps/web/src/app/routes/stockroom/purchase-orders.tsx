import { purchaseOrderStates, type PurchaseOrderState } from '@hidewright/contract';
import { useInfiniteQuery } from '@tanstack/react-query';
import { useSearchParams, type LoaderFunctionArgs } from 'react-router-dom';
import { EmptyState } from '../../../components/empty-state.tsx';
import { LinkButton } from '../../../components/link-button.tsx';
import { PageLoading } from '../../../components/loading.tsx';
import { PageHeader } from '../../../components/page-header.tsx';
import { RouteError } from '../../../components/route-error.tsx';
import { StateFilter } from '../../../components/state-filter.tsx';
import { TextLink } from '../../../components/text-link.tsx';
import { PurchaseOrdersTable } from '../../../features/purchase-orders/components/purchase-orders-table.tsx';
import { purchaseOrdersQuery } from '../../../features/purchase-orders/purchase-orders.queries.ts';
import { queryClient } from '../../../lib/query-client.ts';
import { StockroomNav } from './stockroom-nav.tsx';
import { useRole } from './use-role.ts';
import { ShowEarlier } from '../../../components/show-earlier.tsx';

function stateIn(search: URLSearchParams): PurchaseOrderState | undefined {
  return purchaseOrderStates.find((state) => state === search.get('state'));
}

export async function loader({ request }: LoaderFunctionArgs) {
  const state = stateIn(new URL(request.url).searchParams);
  await queryClient.ensureInfiniteQueryData(purchaseOrdersQuery({ state }));
  return null;
}

export function Component() {
  const [search] = useSearchParams();
  const state = stateIn(search);
  const { isOwner } = useRole();
  const { data, hasNextPage, fetchNextPage, isFetchingNextPage } = useInfiniteQuery(
    purchaseOrdersQuery({ state }),
  );
  if (!data) return <PageLoading />;
  const add = isOwner ? (
    <LinkButton to="/stockroom/purchase-orders/new" tone="primary">
      New purchase order
    </LinkButton>
  ) : undefined;
  const none =
    state === undefined ? (
      <EmptyState title="No purchase orders yet." action={add}>
        Order leather, hardware and supplies here; what comes in is received against the order.
      </EmptyState>
    ) : (
      <EmptyState title={`No purchase order is ${state}.`} />
    );
  return (
    <>
      <PageHeader title="Purchase orders" action={add} />
      <StockroomNav />
      <StateFilter place="/stockroom/purchase-orders" states={purchaseOrderStates} chosen={state} />
      <PurchaseOrdersTable
        rows={data.pages.flatMap((page) => page.items)}
        empty={none}
        after={
          <ShowEarlier pages={{ hasNextPage, isFetchingNextPage, fetchNextPage }} what="orders" />
        }
      />
      <p className="mt-5">
        <TextLink to="/stockroom/deliveries">Deliveries without an order</TextLink>
      </p>
    </>
  );
}

export const ErrorBoundary = RouteError;
