import { useSuspenseQuery } from '@tanstack/react-query';
import { Card } from '../../../components/card.tsx';
import { PageHeader } from '../../../components/page-header.tsx';
import { RouteError } from '../../../components/route-error.tsx';
import { AddPersonForm } from '../../../features/office/components/add-person-form.tsx';
import { OfficeNav } from '../../../features/office/components/office-nav.tsx';
import { PeopleList } from '../../../features/office/components/people-list.tsx';
import { peopleQuery } from '../../../features/office/office.queries.ts';
import { queryClient } from '../../../lib/query-client.ts';

export async function loader() {
  await queryClient.ensureQueryData(peopleQuery());
  return null;
}

export function Component() {
  const { data: people } = useSuspenseQuery(peopleQuery());
  return (
    <>
      <PageHeader title="People" subtitle="Who signs in, and as what" />
      <OfficeNav />
      <div className="grid grid-cols-[minmax(0,1fr)] items-start gap-5 xl:grid-cols-[minmax(0,3fr)_minmax(0,2fr)]">
        <Card title="Who signs in">
          <PeopleList people={people.items} />
        </Card>
        <Card title="Add somebody">
          <AddPersonForm />
        </Card>
      </div>
    </>
  );
}

export const ErrorBoundary = RouteError;
