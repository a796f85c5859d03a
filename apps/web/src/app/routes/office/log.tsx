import { useSuspenseInfiniteQuery } from '@tanstack/react-query';
import { Button } from '../../../components/button.tsx';
import { PageHeader } from '../../../components/page-header.tsx';
import { RouteError } from '../../../components/route-error.tsx';
import { ActivityList } from '../../../features/office/components/activity-list.tsx';
import { OfficeNav } from '../../../features/office/components/office-nav.tsx';
import { activitiesQuery } from '../../../features/office/office.queries.ts';
import { queryClient } from '../../../lib/query-client.ts';

export async function loader() {
  await queryClient.ensureInfiniteQueryData(activitiesQuery());
  return null;
}

export function Component() {
  const { data, hasNextPage, fetchNextPage, isFetchingNextPage } =
    useSuspenseInfiniteQuery(activitiesQuery());
  return (
    <>
      <PageHeader title="Who did what" subtitle="Written once, never changed" />
      <OfficeNav />
      <ActivityList activities={data.pages.flatMap((page) => page.items)} />
      {hasNextPage && (
        <Button className="mt-4" busy={isFetchingNextPage} onClick={() => void fetchNextPage()}>
          Earlier
        </Button>
      )}
    </>
  );
}

export const ErrorBoundary = RouteError;
