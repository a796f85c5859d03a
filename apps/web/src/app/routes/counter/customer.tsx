import type { Customer } from '@hidewright/contract';
import { useInfiniteQuery, useSuspenseQuery } from '@tanstack/react-query';
import { useLoaderData, type LoaderFunctionArgs } from 'react-router-dom';
import { Card } from '../../../components/card.tsx';
import { EmptyState } from '../../../components/empty-state.tsx';
import { LinkButton } from '../../../components/link-button.tsx';
import { PageHeader } from '../../../components/page-header.tsx';
import { RouteError } from '../../../components/route-error.tsx';
import { ChangeCustomerForm } from '../../../features/customers/components/change-customer-form.tsx';
import { customerQuery } from '../../../features/customers/customers.queries.ts';
import { InvoicesTable } from '../../../features/invoices/components/invoices-table.tsx';
import { invoicesQuery } from '../../../features/invoices/invoices.queries.ts';
import { QuotesTable } from '../../../features/quotes/components/quotes-table.tsx';
import { quotesQuery } from '../../../features/quotes/quotes.queries.ts';
import { sessionQuery } from '../../../features/session/session.queries.ts';
import { ShowEarlier } from '../../../components/show-earlier.tsx';
import { queryClient } from '../../../lib/query-client.ts';

export async function loader({ params }: LoaderFunctionArgs) {
  const id = Number(params['id']);
  const [customer] = await Promise.all([
    queryClient.ensureQueryData(customerQuery(id)),
    queryClient.ensureInfiniteQueryData(quotesQuery({ customerId: id })),
    queryClient.ensureInfiniteQueryData(invoicesQuery({ customerId: id })),
  ]);
  return customer;
}

export function Component() {
  const { id } = useLoaderData<Customer>();
  const { data: customer } = useSuspenseQuery(customerQuery(id));
  const { data: session } = useSuspenseQuery(sessionQuery());
  const { data: quotes } = useInfiniteQuery(quotesQuery({ customerId: id }));
  const isOwner = session.person?.role === 'owner';
  const newQuote = (
    <LinkButton to={`/counter/quotes/new?customer=${id}`} tone="primary">
      New quote
    </LinkButton>
  );
  return (
    <>
      <PageHeader title={customer.name} action={isOwner ? newQuote : undefined} />
      <div className="grid items-start gap-5 xl:grid-cols-[minmax(0,26rem)_minmax(0,1fr)]">
        <Card title="How to reach them">
          <ChangeCustomerForm key={customer.id} customer={customer} />
        </Card>
        <div className="space-y-5">
          <Card title="Their quotes">
            <QuotesTable
              rows={quotes?.pages.flatMap((page) => page.items) ?? []}
              withoutCustomer
              empty={
                <EmptyState
                  title="No quotes for them yet."
                  action={isOwner ? newQuote : undefined}
                />
              }
            />
          </Card>
          <Card title="Their invoices" aside={isOwner && <SellTo id={id} />}>
            <TheirInvoices id={id} />
          </Card>
        </div>
      </div>
    </>
  );
}

function SellTo({ id }: { id: number }) {
  return <LinkButton to={`/stockroom/finished?for=${id}`}>Sell from the shelf</LinkButton>;
}

function TheirInvoices({ id }: { id: number }) {
  const { data, hasNextPage, fetchNextPage, isFetchingNextPage } = useInfiniteQuery(
    invoicesQuery({ customerId: id }),
  );
  return (
    <InvoicesTable
      rows={data?.pages.flatMap((page) => page.items) ?? []}
      ofOneCustomer
      empty={<p className="text-ink-soft">They have no invoice yet.</p>}
      after={
        <ShowEarlier pages={{ hasNextPage, isFetchingNextPage, fetchNextPage }} what="invoices" />
      }
    />
  );
}

export const ErrorBoundary = RouteError;
