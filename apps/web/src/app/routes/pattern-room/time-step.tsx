import type { Pattern } from '@hidewright/contract';
import { useSuspenseQuery } from '@tanstack/react-query';
import { useLoaderData, useSearchParams, type LoaderFunctionArgs } from 'react-router-dom';
import { LinkButton } from '../../../components/link-button.tsx';
import { PageHeader } from '../../../components/page-header.tsx';
import { RouteError } from '../../../components/route-error.tsx';
import { StepChoice } from '../../../features/patterns/components/step-choice.tsx';
import { TimeStudy } from '../../../features/patterns/components/time-study.tsx';
import { timeReadingsQuery } from '../../../features/patterns/learned.queries.ts';
import { patternQuery } from '../../../features/patterns/patterns.queries.ts';
import { timedSteps } from '../../../features/patterns/timed-pattern.ts';
import { sessionQuery } from '../../../features/session/session.queries.ts';
import { queryClient } from '../../../lib/query-client.ts';

export async function loader({ params }: LoaderFunctionArgs) {
  const id = Number(params['id']);
  const [pattern] = await Promise.all([
    queryClient.ensureQueryData(patternQuery(id)),
    queryClient.ensureQueryData(timeReadingsQuery(id)),
  ]);
  return pattern;
}

/** The step and the source stand in the address, so that a reload finds the clock that runs. */
export function Component() {
  const { id } = useLoaderData<Pattern>();
  const { data: pattern } = useSuspenseQuery(patternQuery(id));
  const { data: found } = useSuspenseQuery(timeReadingsQuery(id));
  const { data: session } = useSuspenseQuery(sessionQuery());
  const [search, setSearch] = useSearchParams();
  const steps = timedSteps(pattern);
  const asked = Number(search.get('step') ?? '1') - 1;
  const step = steps[asked] === undefined ? 0 : asked;
  const stepName = steps[step]?.name ?? '';
  const source = search.get('from') === 'tickets' ? 'tickets' : 'readings';
  return (
    <>
      <PageHeader
        title={`Time a step of ${pattern.name}`}
        subtitle="A few readings say how long a step takes, and how sure that is."
        action={<LinkButton to={`/pattern-room/patterns/${id}`}>Back to the pattern</LinkButton>}
      />
      <StepChoice
        steps={steps.map(({ name }) => name)}
        step={step}
        source={source}
        onChoose={(chosen) => setSearch(chosen, { replace: true, preventScrollReset: true })}
      />
      <TimeStudy
        key={stepName}
        pattern={pattern}
        step={step}
        stepName={stepName}
        found={found}
        source={source}
        isOwner={session.person?.role === 'owner'}
      />
    </>
  );
}

export const ErrorBoundary = RouteError;
