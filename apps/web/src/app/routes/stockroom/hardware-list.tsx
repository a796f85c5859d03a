import { useSuspenseInfiniteQuery } from '@tanstack/react-query';
import { EmptyState } from '../../../components/empty-state.tsx';
import { LinkButton } from '../../../components/link-button.tsx';
import { PageHeader } from '../../../components/page-header.tsx';
import { RouteError } from '../../../components/route-error.tsx';
import { ShowEarlier } from '../../../components/show-earlier.tsx';
import { HardwareTable } from '../../../features/hardware/components/hardware-table.tsx';
import { hardwarePagesQuery } from '../../../features/hardware/hardware.queries.ts';
import { queryClient } from '../../../lib/query-client.ts';
import { StockroomNav } from './stockroom-nav.tsx';
import { useRole } from './use-role.ts';

export async function loader() {
  await queryClient.ensureInfiniteQueryData(hardwarePagesQuery());
  return null;
}

export function Component() {
  const { isOwner } = useRole();
  const hardware = useSuspenseInfiniteQuery(hardwarePagesQuery());
  const add = isOwner ? (
    <LinkButton to="/stockroom/hardware/new" tone="primary">
      New hardware or supplies
    </LinkButton>
  ) : undefined;
  return (
    <>
      <PageHeader title="Hardware and supplies" action={add} />
      <StockroomNav />
      <HardwareTable
        rows={hardware.data.pages.flatMap((page) => page.items)}
        empty={
          <EmptyState title="No hardware yet." action={add}>
            Add your rivets, snaps and rings, and what you use up, with their prices; then receive
            or count them.
          </EmptyState>
        }
        after={<ShowEarlier pages={hardware} what="hardware and supplies" />}
      />
    </>
  );
}

export const ErrorBoundary = RouteError;
