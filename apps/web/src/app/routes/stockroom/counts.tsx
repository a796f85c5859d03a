import { useSuspenseQuery } from '@tanstack/react-query';
import { PageHeader } from '../../../components/page-header.tsx';
import { RouteError } from '../../../components/route-error.tsx';
import { CountsTable } from '../../../features/counts/components/counts-table.tsx';
import { OpenCount } from '../../../features/counts/components/open-count.tsx';
import { countPlacesQuery, countsQuery } from '../../../features/counts/counts.queries.ts';
import { leathersQuery } from '../../../features/leathers/leathers.queries.ts';
import { sessionQuery } from '../../../features/session/session.queries.ts';
import { queryClient } from '../../../lib/query-client.ts';
import { choicesOf } from './choices.ts';
import { StockroomNav } from './stockroom-nav.tsx';
import { useRole } from './use-role.ts';

export async function loader() {
  const { person } = await queryClient.ensureQueryData(sessionQuery());
  await Promise.all([
    queryClient.ensureInfiniteQueryData(countsQuery()),
    queryClient.ensureQueryData(leathersQuery()),
    person?.role !== 'bookkeeper' && queryClient.ensureQueryData(countPlacesQuery()),
  ]);
  return null;
}

export function Component() {
  const { handlesStock } = useRole();
  const { data: leathers } = useSuspenseQuery(leathersQuery());
  return (
    <>
      <PageHeader title="Counts" subtitle="What is really there, shelf by shelf" />
      <StockroomNav />
      <div className="grid items-start gap-5 xl:grid-cols-[minmax(0,24rem)_minmax(0,1fr)]">
        {handlesStock && <OpenCount leathers={choicesOf(leathers.items)} />}
        <CountsTable />
      </div>
    </>
  );
}

export const ErrorBoundary = RouteError;
