import type { JobCard, JobState } from '@hidewright/contract';
import { useSuspenseQuery } from '@tanstack/react-query';
import { EmptyState } from '../../../components/empty-state.tsx';
import { LinkButton } from '../../../components/link-button.tsx';
import { PageHeader } from '../../../components/page-header.tsx';
import { RouteError } from '../../../components/route-error.tsx';
import { BenchCalendar } from '../../../features/jobs/components/bench-calendar.tsx';
import { JobTickets } from '../../../features/jobs/components/job-tickets.tsx';
import {
  benchHoursQuery,
  finishedJobsQuery,
  openJobsQuery,
} from '../../../features/jobs/jobs.queries.ts';
import { sessionQuery } from '../../../features/session/session.queries.ts';
import { queryClient } from '../../../lib/query-client.ts';

export async function loader() {
  await Promise.all([
    queryClient.ensureQueryData(openJobsQuery()),
    queryClient.ensureQueryData(finishedJobsQuery()),
    queryClient.ensureQueryData(benchHoursQuery()),
  ]);
  return null;
}

const groups: { state: JobState; title: string }[] = [
  { state: 'at the bench', title: 'At the bench' },
  { state: 'ready', title: 'Ready' },
  { state: 'paused', title: 'Paused' },
  { state: 'waiting', title: 'Waiting' },
];

export function Component() {
  const { data: open } = useSuspenseQuery(openJobsQuery());
  const { data: finished } = useSuspenseQuery(finishedJobsQuery());
  const { data: hours } = useSuspenseQuery(benchHoursQuery());
  const { data: session } = useSuspenseQuery(sessionQuery());
  const isOwner = session.person?.role === 'owner';
  return (
    <>
      <PageHeader
        title="Bench"
        subtitle="What to make next, and what it takes"
        action={
          <div className="flex flex-wrap gap-2">
            <LinkButton to="/bench/checks">Can we make it?</LinkButton>
            {isOwner && <LinkButton to="/bench/week-mix">A week’s mix</LinkButton>}
          </div>
        }
      />
      <div className="grid items-start gap-6 xl:grid-cols-[minmax(0,3fr)_minmax(0,2fr)]">
        <div>
          {open.items.length === 0 && <NoTickets isOwner={isOwner} />}
          {groups.map(({ state, title }) => (
            <JobTickets
              key={state}
              title={title}
              jobs={open.items.filter((job) => job.state === state)}
            />
          ))}
          <Finished jobs={finished.items} />
        </div>
        <BenchCalendar hours={hours} />
      </div>
    </>
  );
}

function NoTickets({ isOwner }: { isOwner: boolean }) {
  return (
    <div className="mb-6">
      <EmptyState
        title="No tickets at the bench."
        action={isOwner && <LinkButton to="/counter/quotes">Go to the quotes</LinkButton>}
      >
        A ticket comes when an agreed quote is taken on.
      </EmptyState>
    </div>
  );
}

function Finished({ jobs }: { jobs: readonly JobCard[] }) {
  if (jobs.length === 0) return null;
  return (
    <details>
      <summary className="mb-2 min-h-11 py-2 font-semibold">
        Finished or cancelled lately ({jobs.length})
      </summary>
      <JobTickets title="Finished" jobs={jobs.filter((job) => !job.cancelled)} />
      <JobTickets title="Cancelled" jobs={jobs.filter((job) => job.cancelled)} />
    </details>
  );
}

export const ErrorBoundary = RouteError;
