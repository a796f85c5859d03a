import { useSuspenseQuery } from '@tanstack/react-query';
import { EmptyState } from '../../../components/empty-state.tsx';
import { LinkButton } from '../../../components/link-button.tsx';
import { PageHeader } from '../../../components/page-header.tsx';
import { RouteError } from '../../../components/route-error.tsx';
import { LeathersTable } from '../../../features/leathers/components/leathers-table.tsx';
import { leathersQuery } from '../../../features/leathers/leathers.queries.ts';
import { queryClient } from '../../../lib/query-client.ts';
import { StockroomNav } from './stockroom-nav.tsx';
import { useRole } from './use-role.ts';

export async function loader() {
  await queryClient.ensureQueryData(leathersQuery());
  return null;
}

export function Component() {
  const { isOwner } = useRole();
  const { data: leathers } = useSuspenseQuery(leathersQuery());
  const add = isOwner ? (
    <LinkButton to="/stockroom/leather/new" tone="primary">
      New leather
    </LinkButton>
  ) : undefined;
  return (
    <>
      <PageHeader title="Leather" action={add} />
      <StockroomNav />
      <LeathersTable
        rows={leathers.items}
        empty={
          <EmptyState title="No leather yet." action={add}>
            Add what you buy, with its price per ft²; the lots that you receive of it hang below it.
          </EmptyState>
        }
      />
    </>
  );
}

export const ErrorBoundary = RouteError;
