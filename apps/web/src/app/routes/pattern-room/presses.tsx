import { useSuspenseQuery } from '@tanstack/react-query';
import { Card } from '../../../components/card.tsx';
import { EmptyState } from '../../../components/empty-state.tsx';
import { LinkButton } from '../../../components/link-button.tsx';
import { PageHeader } from '../../../components/page-header.tsx';
import { RouteError } from '../../../components/route-error.tsx';
import { say } from '../../../components/toast.ts';
import { AddPressForm } from '../../../features/presses/components/add-press-form.tsx';
import { PressesTable } from '../../../features/presses/components/presses-table.tsx';
import { pressesQuery } from '../../../features/presses/presses.queries.ts';
import { sessionQuery } from '../../../features/session/session.queries.ts';
import { queryClient } from '../../../lib/query-client.ts';
import { PatternRoomNav } from './pattern-room-nav.tsx';

export async function loader() {
  await queryClient.ensureQueryData(pressesQuery());
  return null;
}

export function Component() {
  const { data: session } = useSuspenseQuery(sessionQuery());
  const { data: presses } = useSuspenseQuery(pressesQuery());
  const isOwner = session.person?.role === 'owner';
  return (
    <>
      <PageHeader
        title="Presses"
        subtitle="What goes in, and what one strike manages"
        action={
          isOwner && <LinkButton to="/pattern-room/presses/pays">Does the machine pay?</LinkButton>
        }
      />
      <PatternRoomNav />
      <div className={isOwner ? 'grid items-start gap-5 xl:grid-cols-[minmax(0,1fr)_24rem]' : ''}>
        <PressesTable
          rows={presses.items}
          mayChange={isOwner}
          empty={
            <EmptyState title="No press yet.">
              Enter what its bed takes and what it manages, by your own experience: patterns then
              show whether a strip goes in and how hard a strike is for it.
            </EmptyState>
          }
        />
        {isOwner && (
          <Card title="Add a press">
            <AddPressForm onAdded={(press) => say(`${press.name} is added.`)} />
          </Card>
        )}
      </div>
    </>
  );
}

export const ErrorBoundary = RouteError;
