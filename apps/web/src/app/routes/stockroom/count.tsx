import type { StockCount } from '@hidewright/contract';
import { useSuspenseQuery } from '@tanstack/react-query';
import { useState } from 'react';
import { useLoaderData, type LoaderFunctionArgs } from 'react-router-dom';
import { Button } from '../../../components/button.tsx';
import { Card } from '../../../components/card.tsx';
import { ConfirmDialog } from '../../../components/confirm-dialog.tsx';
import { Notice } from '../../../components/notice.tsx';
import { PageHeader } from '../../../components/page-header.tsx';
import { RouteError } from '../../../components/route-error.tsx';
import { StateMark } from '../../../components/state-mark.tsx';
import { say } from '../../../components/toast.ts';
import { CountReview } from '../../../features/counts/components/count-review.tsx';
import { CountSheet } from '../../../features/counts/components/count-sheet.tsx';
import { LeftOnDevice } from '../../../features/counts/components/left-on-device.tsx';
import { useCancelCount } from '../../../features/counts/counts.mutations.ts';
import { countQuery } from '../../../features/counts/counts.queries.ts';
import { sessionQuery } from '../../../features/session/session.queries.ts';
import { HeldLines } from '../../../features/stock/components/held-list.tsx';
import { instantText } from '../../../lib/formatting.ts';
import { queryClient } from '../../../lib/query-client.ts';
import { useWorkshop } from '../../../lib/workshop.tsx';
import { useRole } from './use-role.ts';

export async function loader({ params }: LoaderFunctionArgs) {
  return queryClient.ensureQueryData(countQuery(Number(params['id'])));
}

export function Component() {
  const { id } = useLoaderData<StockCount>();
  const { isOwner, handlesStock } = useRole();
  const { data: sheet } = useSuspenseQuery(countQuery(id));
  const { data: session } = useSuspenseQuery(sessionQuery());
  const person = session.person?.email ?? '';
  const counting = sheet.state === 'open' && handlesStock;
  return (
    <>
      <PageHeader
        title={sheet.title}
        subtitle={<Story sheet={sheet} />}
        action={isOwner && <PutAside sheet={sheet} />}
      />
      {counting ? (
        <CountSheet key={id} sheet={sheet} person={person} />
      ) : (
        <div className="space-y-4">
          {handlesStock && <LeftOnDevice key={id} sheet={sheet} person={person} />}
          <LeftShort sheet={sheet} />
          {sheet.state === 'handed in' && !isOwner && (
            <Notice>The owner looks at it next. Nothing is changed until it is approved.</Notice>
          )}
          <Card>
            <CountReview sheet={sheet} isOwner={isOwner} />
          </Card>
        </div>
      )}
    </>
  );
}

function Story({ sheet }: { sheet: StockCount }) {
  const { timeZone } = useWorkshop();
  const { state, openedAt, openedByName, handedInAt, handedInByName, settledAt } = sheet;
  const parts = [
    `opened ${instantText(openedAt, timeZone)} by ${openedByName}`,
    handedInAt && `handed in ${instantText(handedInAt, timeZone)} by ${handedInByName ?? ''}`,
    settledAt && `${state} ${instantText(settledAt, timeZone)} by ${sheet.settledByName ?? ''}`,
  ];
  return (
    <span className="flex flex-wrap items-center gap-x-3 gap-y-1">
      <StateMark state={state} />
      {parts.filter(Boolean).join(', ')}
    </span>
  );
}

/** The jobs that approving it would leave short: told before, not after. */
function LeftShort({ sheet }: { sheet: StockCount }) {
  if (!sheet.broken || sheet.broken.length === 0) return null;
  return (
    <Notice tone="attention" title="Less is there than jobs hold.">
      Once this is approved, one of the jobs that share a thing here runs short: order more of it,
      or move a job.
      <HeldLines held={sheet.broken} mayOpenJobs namesThings />
    </Notice>
  );
}

function PutAside({ sheet }: { sheet: StockCount }) {
  const [asking, setAsking] = useState(false);
  const cancel = useCancelCount();
  if (sheet.state !== 'open' && sheet.state !== 'handed in') return null;
  return (
    <>
      <Button onClick={() => setAsking(true)}>Put it aside</Button>
      <ConfirmDialog
        open={asking}
        onOpenChange={setAsking}
        title={`Put ${sheet.title} aside?`}
        confirmWord="Put it aside"
        tone="danger"
        onConfirm={async () => {
          await cancel.mutateAsync({ params: { id: sheet.id }, body: {} });
          say(`${sheet.title} is put aside.`);
        }}
      >
        The books stay as they are, and this sheet cannot be taken up again.
      </ConfirmDialog>
    </>
  );
}

export const ErrorBoundary = RouteError;
