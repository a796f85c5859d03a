import { useQuery, useSuspenseQuery } from '@tanstack/react-query';
import { Card } from '../../../components/card.tsx';
import { EmptyState } from '../../../components/empty-state.tsx';
import { LinkButton } from '../../../components/link-button.tsx';
import { Skeleton } from '../../../components/loading.tsx';
import { PageHeader } from '../../../components/page-header.tsx';
import { RouteError } from '../../../components/route-error.tsx';
import { sessionQuery } from '../../../features/session/session.queries.ts';
import { PlateOffers } from '../../../features/tools/components/plate-offers.tsx';
import { ToolsTable } from '../../../features/tools/components/tools-table.tsx';
import { plateOffersQuery, toolsQuery } from '../../../features/tools/tools.queries.ts';
import { queryClient } from '../../../lib/query-client.ts';
import { PatternRoomNav } from './pattern-room-nav.tsx';

export async function loader() {
  await queryClient.ensureQueryData(toolsQuery());
  return null;
}

export function Component() {
  const { data: session } = useSuspenseQuery(sessionQuery());
  const { data: tools } = useSuspenseQuery(toolsQuery());
  const isOwner = session.person?.role === 'owner';
  const add = isOwner ? (
    <LinkButton to="/pattern-room/tooling/new" tone="primary">
      New tool
    </LinkButton>
  ) : undefined;
  return (
    <>
      <PageHeader title="Tooling" action={add} />
      <PatternRoomNav />
      <ToolsTable
        rows={tools.items}
        empty={
          <EmptyState title="No cutting dies or stamp plates yet." action={add}>
            Keep them here with what they cost, how long they last and where they lie; the bench
            then counts every cut and impression.
          </EmptyState>
        }
      />
      {isOwner && <NewPlates />}
    </>
  );
}

/** Prices are the owner's alone. */
function NewPlates() {
  const { data } = useQuery(plateOffersQuery());
  return (
    <Card
      className="mt-5"
      title="New plates"
      subtitle="What one costs and lasts, by metal: your own figures"
    >
      {data ? <PlateOffers offers={data.items} /> : <Skeleton />}
    </Card>
  );
}

export const ErrorBoundary = RouteError;
