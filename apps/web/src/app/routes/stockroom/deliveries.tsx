import { useSuspenseInfiniteQuery } from '@tanstack/react-query';
import { EmptyState } from '../../../components/empty-state.tsx';
import { LinkButton } from '../../../components/link-button.tsx';
import { PageHeader } from '../../../components/page-header.tsx';
import { RouteError } from '../../../components/route-error.tsx';
import { ReceiptCard } from '../../../features/purchase-orders/components/receipt-card.tsx';
import { receiptsWithoutOrderQuery } from '../../../features/purchase-orders/purchase-orders.queries.ts';
import { queryClient } from '../../../lib/query-client.ts';
import { useRole } from './use-role.ts';
import { ShowEarlier } from '../../../components/show-earlier.tsx';

export async function loader() {
  await queryClient.ensureInfiniteQueryData(receiptsWithoutOrderQuery());
  return null;
}

export function Component() {
  const { isOwner, handlesStock } = useRole();
  const { data, hasNextPage, fetchNextPage, isFetchingNextPage } = useSuspenseInfiniteQuery(
    receiptsWithoutOrderQuery(),
  );
  const receipts = data.pages.flatMap((page) => page.items);
  return (
    <>
      <PageHeader
        title="Deliveries without an order"
        subtitle="The latest first. What came for an order stands on the order’s own page."
        action={
          handlesStock && (
            <LinkButton to="/stockroom/receive?order=none">Receive without an order</LinkButton>
          )
        }
      />
      {receipts.length === 0 && (
        <EmptyState title="Everything so far came for an order.">
          What is received without one is listed here, with what it cost.
        </EmptyState>
      )}
      <div className="space-y-5">
        {receipts.map((receipt) => (
          <ReceiptCard key={receipt.id} receipt={receipt} isOwner={isOwner} />
        ))}
      </div>
      <ShowEarlier pages={{ hasNextPage, isFetchingNextPage, fetchNextPage }} what="deliveries" />
    </>
  );
}

export const ErrorBoundary = RouteError;
