import type { Job } from '@hidewright/contract';
import { useQuery, useSuspenseQuery } from '@tanstack/react-query';
import { useLoaderData, type LoaderFunctionArgs } from 'react-router-dom';
import { Button } from '../../../components/button.tsx';
import { Notice } from '../../../components/notice.tsx';
import { RouteError } from '../../../components/route-error.tsx';
import { EstimateAndFact } from '../../../features/jobs/components/estimate-and-fact.tsx';
import { FinishCard } from '../../../features/jobs/components/finish-card.tsx';
import { JobLayout } from '../../../features/jobs/components/job-layout.tsx';
import { LogList } from '../../../features/jobs/components/log-list.tsx';
import { PauseButton } from '../../../features/jobs/components/pause-button.tsx';
import { PrintedSteps } from '../../../features/jobs/components/printed-steps.tsx';
import { StepList } from '../../../features/jobs/components/step-list.tsx';
import { StockCard } from '../../../features/jobs/components/stock-card.tsx';
import { TicketHead } from '../../../features/jobs/components/ticket-head.tsx';
import { WaitingMark } from '../../../features/jobs/components/waiting-mark.tsx';
import { WhyItDiffers } from '../../../features/jobs/components/why-it-differs.tsx';
import { comparisonQuery, jobQuery } from '../../../features/jobs/jobs.queries.ts';
import { useLogOutbox } from '../../../features/jobs/use-log-outbox.ts';
import { CutFromCard } from '../../../features/lots/components/cut-from-card.tsx';
import { LastTimeCard } from '../../../features/lots/components/last-time-card.tsx';
import { ShipForm } from '../../../features/orders/components/ship-form.tsx';
import { LearnedCard } from '../../../features/patterns/components/learned-card.tsx';
import { sessionQuery } from '../../../features/session/session.queries.ts';
import { queryClient } from '../../../lib/query-client.ts';

export async function loader({ params }: LoaderFunctionArgs) {
  return queryClient.ensureQueryData(jobQuery(Number(params['id'])));
}

export function Component() {
  const { id } = useLoaderData<Job>();
  const { data: job } = useSuspenseQuery(jobQuery(id));
  const { data: session } = useSuspenseQuery(sessionQuery());
  const outbox = useLogOutbox(session.person?.email ?? '');
  const cancelled = job.orderState === 'cancelled';
  const canLog = !cancelled && (job.state === 'ready' || job.state === 'at the bench');
  return (
    <>
      <WaitingMark count={outbox.waiting.length} />
      <TicketHead job={job} actions={<TicketActions job={job} />} />
      <PrintedSteps job={job} />
      <StateNotice job={job} />
      <div className="mt-4 grid items-start gap-5 lg:grid-cols-[minmax(0,1fr)_minmax(0,26rem)] print:block">
        <div className="space-y-5 print:hidden">
          {job.state === 'finished' && !cancelled && (
            <>
              <Compared id={job.id} />
              <LearnedCard patternId={job.patternId} isOwner={session.person?.role === 'owner'} />
            </>
          )}
          <StepList
            job={job}
            waiting={outbox.waiting.filter(({ jobId }) => jobId === job.id)}
            refused={outbox.refused?.log.jobId === job.id ? outbox.refused : undefined}
            canLog={canLog}
            onLog={(body) => outbox.log(job.id, body)}
          />
          <LogList job={job} />
        </div>
        <div className="space-y-5">
          {job.orderState === 'packed' && (
            <div className="print:hidden">
              <ShipForm order={{ id: job.orderId, number: job.orderNumber }} />
            </div>
          )}
          {job.state !== 'finished' && !cancelled && (
            <div className="empty:hidden print:hidden">
              <LastTimeCard of="order" id={job.orderId} />
            </div>
          )}
          <StockCard job={job} canTake={canLog} />
          {job.lots.some(({ takenAreaMm2 }) => takenAreaMm2 !== '0') && (
            <div className="print:hidden">
              <CutFromCard orderId={job.orderId} mayOpenOrders />
            </div>
          )}
          {canLog && (
            <div className="print:hidden">
              <FinishCard key={finishKey(job)} job={job} />
            </div>
          )}
          <JobLayout job={job} />
        </div>
      </div>
    </>
  );
}

/** What the finishing form begins with changes with what is logged and taken. */
const finishKey = ({ steps, lots, hardware }: Job): string =>
  JSON.stringify([
    steps.map(({ good }) => good),
    lots.map(({ takenAreaMm2 }) => takenAreaMm2),
    hardware.map(({ taken }) => taken),
  ]);

function TicketActions({ job }: { job: Job }) {
  return (
    <>
      <PauseButton job={job} />
      <Button className="min-h-11" onClick={() => window.print()}>
        Print
      </Button>
    </>
  );
}

function StateNotice({ job }: { job: Job }) {
  if (job.orderState === 'cancelled') return <CancelledTicket job={job} />;
  if (job.state === 'waiting') {
    return (
      <Notice tone="attention" className="mt-4" title="Not yet:">
        {job.orderNumber} awaits {job.awaits.join(' and ')}.
      </Notice>
    );
  }
  if (job.state !== 'paused') return null;
  return (
    <Notice tone="attention" className="mt-4" title="Paused.">
      Resume it to log or take anything.
    </Notice>
  );
}

function CancelledTicket({ job }: { job: Job }) {
  const taken =
    job.state !== 'finished' &&
    (job.lots.some(({ takenAreaMm2 }) => takenAreaMm2 !== '0') ||
      job.hardware.some((item) => item.taken > 0));
  return (
    <Notice tone="attention" className="mt-4" title={`${job.orderNumber} was cancelled.`}>
      Nothing more is made of it.
      {taken && ' Bring back what was taken and can be used; the rest stays spent.'}
    </Notice>
  );
}

function Compared({ id }: { id: number }) {
  const { data } = useQuery(comparisonQuery(id));
  if (!data) return null;
  return (
    <EstimateAndFact comparison={data}>
      <WhyItDiffers jobId={id} />
    </EstimateAndFact>
  );
}

export const ErrorBoundary = RouteError;
