import { useInfiniteQuery } from '@tanstack/react-query';
import { EmptyState } from '../../../components/empty-state.tsx';
import { PageLoading } from '../../../components/loading.tsx';
import { PageHeader } from '../../../components/page-header.tsx';
import { RouteError } from '../../../components/route-error.tsx';
import { PaymentsTable } from '../../../features/invoices/components/payments-table.tsx';
import { paymentsQuery } from '../../../features/invoices/invoices.queries.ts';
import { queryClient } from '../../../lib/query-client.ts';
import { BooksNav } from './books-nav.tsx';
import { ShowEarlier } from '../../../components/show-earlier.tsx';

export async function loader() {
  await queryClient.ensureInfiniteQueryData(paymentsQuery());
  return null;
}

export function Component() {
  const { data, hasNextPage, fetchNextPage, isFetchingNextPage } =
    useInfiniteQuery(paymentsQuery());
  if (!data) return <PageLoading />;
  return (
    <>
      <PageHeader title="Payments" subtitle="Money received" />
      <BooksNav />
      <PaymentsTable
        rows={data.pages.flatMap((page) => page.items)}
        empty={
          <EmptyState title="No payments yet.">
            Open an issued invoice and record what came in for it.
          </EmptyState>
        }
        after={
          <ShowEarlier pages={{ hasNextPage, isFetchingNextPage, fetchNextPage }} what="payments" />
        }
      />
    </>
  );
}

export const ErrorBoundary = RouteError;
