import { invoiceState } from '@hidewright/contract';
import { useInfiniteQuery, useSuspenseQuery } from '@tanstack/react-query';
import { useSearchParams, type LoaderFunctionArgs } from 'react-router-dom';
import { EmptyState } from '../../../components/empty-state.tsx';
import { PageLoading } from '../../../components/loading.tsx';
import { PageHeader } from '../../../components/page-header.tsx';
import { RouteError } from '../../../components/route-error.tsx';
import { StateFilter } from '../../../components/state-filter.tsx';
import { InvoicesTable } from '../../../features/invoices/components/invoices-table.tsx';
import { WaitingOrders } from '../../../features/invoices/components/waiting-orders.tsx';
import {
  invoicesQuery,
  ordersToInvoiceQuery,
} from '../../../features/invoices/invoices.queries.ts';
import { queryClient } from '../../../lib/query-client.ts';
import { BooksNav } from './books-nav.tsx';
import { ShowEarlier } from '../../../components/show-earlier.tsx';

/** Nothing is credited yet by this program. */
const states = invoiceState.options.filter((state) => state !== 'credited');

const readState = (search: URLSearchParams) => invoiceState.safeParse(search.get('state')).data;

export async function loader({ request }: LoaderFunctionArgs) {
  const state = readState(new URL(request.url).searchParams);
  await Promise.all([
    queryClient.ensureInfiniteQueryData(invoicesQuery({ state })),
    queryClient.ensureQueryData(ordersToInvoiceQuery()),
  ]);
  return null;
}

export function Component() {
  const [search] = useSearchParams();
  const state = readState(search);
  const { data: waiting } = useSuspenseQuery(ordersToInvoiceQuery());
  const { data, hasNextPage, fetchNextPage, isFetchingNextPage } = useInfiniteQuery(
    invoicesQuery({ state }),
  );
  if (!data) return <PageLoading />;
  return (
    <>
      <PageHeader title="Invoices" />
      <BooksNav />
      {state === undefined && <WaitingOrders orders={waiting.items} />}
      <StateFilter place="/books/invoices" states={states} chosen={state} />
      <InvoicesTable
        key={state}
        rows={data.pages.flatMap((page) => page.items)}
        empty={
          state === undefined ? (
            <NoInvoices anyWaiting={waiting.items.length > 0} />
          ) : (
            <EmptyState title={`No invoice is ${state}.`} />
          )
        }
        after={
          <ShowEarlier pages={{ hasNextPage, isFetchingNextPage, fetchNextPage }} what="invoices" />
        }
      />
    </>
  );
}

function NoInvoices({ anyWaiting }: { anyWaiting: boolean }) {
  return (
    <EmptyState title="No invoices yet.">
      {anyWaiting
        ? 'Begin with one of the orders above.'
        : 'An order can be invoiced once it is packed; it then shows here. What lies finished on the shelf is sold from the stockroom.'}
    </EmptyState>
  );
}

export const ErrorBoundary = RouteError;
