import { useSuspenseQuery } from '@tanstack/react-query';
import { EmptyState } from '../../../components/empty-state.tsx';
import { LinkButton } from '../../../components/link-button.tsx';
import { PageHeader } from '../../../components/page-header.tsx';
import { RouteError } from '../../../components/route-error.tsx';
import { PatternsTable } from '../../../features/patterns/components/patterns-table.tsx';
import { patternsQuery } from '../../../features/patterns/patterns.queries.ts';
import { sessionQuery } from '../../../features/session/session.queries.ts';
import { queryClient } from '../../../lib/query-client.ts';
import { PatternRoomNav } from './pattern-room-nav.tsx';

export async function loader() {
  await queryClient.ensureQueryData(patternsQuery());
  return null;
}

export function Component() {
  const { data: session } = useSuspenseQuery(sessionQuery());
  const { data: patterns } = useSuspenseQuery(patternsQuery());
  const isOwner = session.person?.role === 'owner';
  const add = isOwner ? (
    <LinkButton to="/pattern-room/patterns/new" tone="primary">
      New pattern
    </LinkButton>
  ) : undefined;
  return (
    <>
      <PageHeader title="Patterns" action={add} />
      <PatternRoomNav />
      <PatternsTable
        rows={patterns.items}
        empty={
          <EmptyState title="No patterns yet." action={add}>
            {isOwner
              ? 'A pattern says how many pieces the leather gives, what goes on each, and how long the work takes. A quote is made of one.'
              : 'They appear here once the owner has made one.'}
          </EmptyState>
        }
      />
    </>
  );
}

export const ErrorBoundary = RouteError;
