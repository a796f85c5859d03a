import { LinkButton } from '../../../components/link-button.tsx';
import { PageHeader } from '../../../components/page-header.tsx';
import { RouteError } from '../../../components/route-error.tsx';
import { FinishedTable } from '../../../features/finished-pieces/components/finished-table.tsx';
import { finishedPiecesQuery } from '../../../features/finished-pieces/finished-pieces.queries.ts';
import { queryClient } from '../../../lib/query-client.ts';
import { StockroomNav } from './stockroom-nav.tsx';
import { useRole } from './use-role.ts';

export async function loader() {
  await queryClient.ensureInfiniteQueryData(finishedPiecesQuery());
  return null;
}

export function Component() {
  const { handlesStock } = useRole();
  return (
    <>
      <PageHeader
        title="Finished pieces"
        subtitle="More than was ordered, and seconds; at what their leather and hardware cost, wages left out"
        action={
          handlesStock && <LinkButton to="/stockroom/finished/new">Put on the shelf</LinkButton>
        }
      />
      <StockroomNav />
      <FinishedTable />
    </>
  );
}

export const ErrorBoundary = RouteError;
