import { useSuspenseQuery } from '@tanstack/react-query';
import { EmptyState } from '../../../components/empty-state.tsx';
import { LinkButton } from '../../../components/link-button.tsx';
import { PageHeader } from '../../../components/page-header.tsx';
import { RouteError } from '../../../components/route-error.tsx';
import { SuppliersTable } from '../../../features/suppliers/components/suppliers-table.tsx';
import { suppliersQuery } from '../../../features/suppliers/suppliers.queries.ts';
import { queryClient } from '../../../lib/query-client.ts';
import { StockroomNav } from './stockroom-nav.tsx';
import { useRole } from './use-role.ts';

export async function loader() {
  await queryClient.ensureQueryData(suppliersQuery());
  return null;
}

export function Component() {
  const { isOwner } = useRole();
  const { data: suppliers } = useSuspenseQuery(suppliersQuery());
  const add = isOwner ? (
    <LinkButton to="/stockroom/suppliers/new" tone="primary">
      New supplier
    </LinkButton>
  ) : undefined;
  return (
    <>
      <PageHeader title="Suppliers" action={add} />
      <StockroomNav />
      <SuppliersTable
        rows={suppliers.items}
        empty={
          <EmptyState title="No suppliers yet." action={add}>
            Add whom you buy from, and how many days they need; then you can send them orders.
          </EmptyState>
        }
      />
    </>
  );
}

export const ErrorBoundary = RouteError;
