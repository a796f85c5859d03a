import { useSuspenseQuery } from '@tanstack/react-query';
import { EmptyState } from '../../../components/empty-state.tsx';
import { LinkButton } from '../../../components/link-button.tsx';
import { PageHeader } from '../../../components/page-header.tsx';
import { RouteError } from '../../../components/route-error.tsx';
import { CustomersTable } from '../../../features/customers/components/customers-table.tsx';
import { customersQuery } from '../../../features/customers/customers.queries.ts';
import { sessionQuery } from '../../../features/session/session.queries.ts';
import { queryClient } from '../../../lib/query-client.ts';
import { CounterNav } from './counter-nav.tsx';

export async function loader() {
  await queryClient.ensureQueryData(customersQuery());
  return null;
}

export function Component() {
  const { data: session } = useSuspenseQuery(sessionQuery());
  const { data: customers } = useSuspenseQuery(customersQuery());
  const isOwner = session.person?.role === 'owner';
  const add = (
    <LinkButton to="/counter/customers/new" tone="primary">
      New customer
    </LinkButton>
  );
  return (
    <>
      <PageHeader title="Customers" action={isOwner ? add : undefined} />
      <CounterNav />
      <CustomersTable
        rows={customers.items}
        empty={
          <EmptyState title="No customers yet." action={isOwner ? add : undefined}>
            Add the first one here, or while you draft a quote for them.
          </EmptyState>
        }
      />
    </>
  );
}

export const ErrorBoundary = RouteError;
