import type { Pattern } from '@hidewright/contract';
import { keepPreviousData, useQuery, useSuspenseQuery } from '@tanstack/react-query';
import { useCallback, useState } from 'react';
import { useLoaderData, useSearchParams, type LoaderFunctionArgs } from 'react-router-dom';
import { Card } from '../../../components/card.tsx';
import { LinkButton } from '../../../components/link-button.tsx';
import { Skeleton } from '../../../components/loading.tsx';
import { PageHeader } from '../../../components/page-header.tsx';
import { RouteError } from '../../../components/route-error.tsx';
import { LearnedTogether } from '../../../features/patterns/components/learned-together.tsx';
import { PastRunsTable } from '../../../features/patterns/components/past-runs-table.tsx';
import { TakeLearned } from '../../../features/patterns/components/take-learned.tsx';
import { WhoseRuns } from '../../../features/patterns/components/whose-runs.tsx';
import { learnedQuery } from '../../../features/patterns/learned.queries.ts';
import { patternQuery } from '../../../features/patterns/patterns.queries.ts';
import { sessionQuery } from '../../../features/session/session.queries.ts';
import { queryClient } from '../../../lib/query-client.ts';

export async function loader({ params }: LoaderFunctionArgs) {
  const id = Number(params['id']);
  const [pattern] = await Promise.all([
    queryClient.ensureQueryData(patternQuery(id)),
    queryClient.ensureQueryData(learnedQuery(id)),
  ]);
  return pattern;
}

export function Component() {
  const { id, name } = useLoaderData<Pattern>();
  const { data: session } = useSuspenseQuery(sessionQuery());
  const [without, setWithout] = useState<number[]>([]);
  const [search, setSearch] = useSearchParams();
  const customerId = Number(search.get('customer')) || undefined;
  const { data: learned, isPlaceholderData } = useQuery({
    ...learnedQuery(id, without, customerId),
    placeholderData: keepPreviousData,
  });
  const mix = useCallback(
    (jobId: number, mixedIn: boolean) =>
      setWithout((ids) => (mixedIn ? ids.filter((each) => each !== jobId) : [...ids, jobId])),
    [],
  );
  if (!learned) return <Skeleton />;
  return (
    <>
      <PageHeader
        title={`What the last runs say of ${name}`}
        subtitle={`Finished jobs, the latest eight at most; the pattern is at version ${learned.versionNumber}.`}
        action={<LinkButton to={`/pattern-room/patterns/${id}`}>Back to the pattern</LinkButton>}
      />
      <div className="grid items-start gap-5 xl:grid-cols-[minmax(0,1fr)_minmax(0,30rem)]">
        <div className="grid gap-5">
          <WhoseRuns
            learned={learned}
            onChoose={(whose) => {
              setWithout([]);
              setSearch(whose === undefined ? {} : { customer: String(whose) }, { replace: true });
            }}
          />
          <Card title="Run by run">
            <PastRunsTable runs={learned.runs} onMix={mix} />
          </Card>
          {learned.runs.length > 0 && <LearnedTogether learned={learned} />}
        </div>
        {session.person?.role === 'owner' && learned.runs.length > 0 && (
          <TakeLearned
            key={learned.customerId}
            learned={learned}
            without={without}
            waits={isPlaceholderData}
          />
        )}
      </div>
    </>
  );
}

export const ErrorBoundary = RouteError;
