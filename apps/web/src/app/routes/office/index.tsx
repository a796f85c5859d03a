import { useSuspenseQuery } from '@tanstack/react-query';
import { Card } from '../../../components/card.tsx';
import { PageHeader } from '../../../components/page-header.tsx';
import { RouteError } from '../../../components/route-error.tsx';
import { OfficeNav } from '../../../features/office/components/office-nav.tsx';
import { WorkshopForm } from '../../../features/office/components/workshop-form.tsx';
import { workshopQuery } from '../../../features/office/office.queries.ts';
import { queryClient } from '../../../lib/query-client.ts';

export async function loader() {
  await queryClient.ensureQueryData(workshopQuery());
  return null;
}

export function Component() {
  const { data: workshop, refetch } = useSuspenseQuery(workshopQuery());
  return (
    <>
      <PageHeader title="Office" subtitle="The shop and its starting values" />
      <OfficeNav />
      <Card className="max-w-2xl">
        <WorkshopForm
          workshop={workshop}
          onReload={async () => (await refetch()).data ?? workshop}
        />
      </Card>
    </>
  );
}

export const ErrorBoundary = RouteError;
