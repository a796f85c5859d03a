import type { Pattern } from '@hidewright/contract';
import { useSuspenseQuery } from '@tanstack/react-query';
import { useLoaderData, useNavigate, type LoaderFunctionArgs } from 'react-router-dom';
import { PageHeader } from '../../../components/page-header.tsx';
import { RouteError } from '../../../components/route-error.tsx';
import { say } from '../../../components/toast.ts';
import { ChangePatternForm } from '../../../features/patterns/components/change-pattern-form.tsx';
import {
  hardwareChoicesQuery,
  leatherChoicesQuery,
  patternQuery,
} from '../../../features/patterns/patterns.queries.ts';
import { queryClient } from '../../../lib/query-client.ts';

export async function loader({ params }: LoaderFunctionArgs) {
  const [pattern] = await Promise.all([
    queryClient.ensureQueryData(patternQuery(Number(params['id']))),
    queryClient.ensureQueryData(leatherChoicesQuery()),
    queryClient.ensureQueryData(hardwareChoicesQuery()),
  ]);
  return pattern;
}

export function Component() {
  const navigate = useNavigate();
  const { id } = useLoaderData<Pattern>();
  const { data: pattern } = useSuspenseQuery(patternQuery(id));
  return (
    <>
      <PageHeader
        title={`Change ${pattern.name}`}
        subtitle="A change becomes a new version; quotes keep the version they were made with."
      />
      <ChangePatternForm
        key={pattern.id}
        pattern={pattern}
        onChanged={({ name, versionNumber }) => {
          say(`${name} is kept as version ${versionNumber}.`);
          void navigate(`/pattern-room/patterns/${id}`);
        }}
      />
    </>
  );
}

export const ErrorBoundary = RouteError;
