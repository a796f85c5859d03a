import { useSuspenseQuery } from '@tanstack/react-query';
import { useNavigate } from 'react-router-dom';
import { PageHeader } from '../../../components/page-header.tsx';
import { RouteError } from '../../../components/route-error.tsx';
import { say } from '../../../components/toast.ts';
import { AddPatternForm } from '../../../features/patterns/components/add-pattern-form.tsx';
import {
  hardwareChoicesQuery,
  leatherChoicesQuery,
  startingValuesQuery,
} from '../../../features/patterns/patterns.queries.ts';
import { queryClient } from '../../../lib/query-client.ts';

export async function loader() {
  await Promise.all([
    queryClient.ensureQueryData(startingValuesQuery()),
    queryClient.ensureQueryData(leatherChoicesQuery()),
    queryClient.ensureQueryData(hardwareChoicesQuery()),
  ]);
  return null;
}

export function Component() {
  const navigate = useNavigate();
  const { data: startingValues } = useSuspenseQuery(startingValuesQuery());
  return (
    <>
      <PageHeader title="New pattern" />
      <AddPatternForm
        startingValues={startingValues}
        onAdded={({ id, name }) => {
          say(`${name} is kept.`);
          void navigate(`/pattern-room/patterns/${id}`);
        }}
      />
    </>
  );
}

export const ErrorBoundary = RouteError;
