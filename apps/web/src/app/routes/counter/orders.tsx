import { useInfiniteQuery, useSuspenseQuery } from '@tanstack/react-query';
import { EmptyState } from '../../../components/empty-state.tsx';
import { LinkButton } from '../../../components/link-button.tsx';
import { PageLoading } from '../../../components/loading.tsx';
import { PageHeader } from '../../../components/page-header.tsx';
import { RouteError } from '../../../components/route-error.tsx';
import { OrdersTable } from '../../../features/orders/components/orders-table.tsx';
import { ordersQuery } from '../../../features/orders/orders.queries.ts';
import { sessionQuery } from '../../../features/session/session.queries.ts';
import { queryClient } from '../../../lib/query-client.ts';
import { CounterNav } from './counter-nav.tsx';
import { ShowEarlier } from '../../../components/show-earlier.tsx';

export async function loader() {
  await queryClient.ensureInfiniteQueryData(ordersQuery());
  return null;
}

export function Component() {
  const { data, hasNextPage, fetchNextPage, isFetchingNextPage } = useInfiniteQuery(ordersQuery());
  const { data: session } = useSuspenseQuery(sessionQuery());
  if (!data) return <PageLoading />;
  return (
    <>
      <PageHeader title="Orders" subtitle="What the shop has taken on" />
      <CounterNav />
      <OrdersTable
        rows={data.pages.flatMap((page) => page.items)}
        empty={<NoOrders isOwner={session.person?.role === 'owner'} />}
        after={
          <ShowEarlier pages={{ hasNextPage, isFetchingNextPage, fetchNextPage }} what="orders" />
        }
      />
    </>
  );
}

function NoOrders({ isOwner }: { isOwner: boolean }) {
  return (
    <EmptyState
      title="No orders yet."
      action={isOwner && <LinkButton to="/counter/quotes">Go to the quotes</LinkButton>}
    >
      An order comes when a customer has agreed to a quote and the shop takes it on.
    </EmptyState>
  );
}

export const ErrorBoundary = RouteError;
