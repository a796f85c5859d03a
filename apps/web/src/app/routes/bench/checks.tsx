import type { RunsCheck } from '@hidewright/contract';
import { useSuspenseQuery } from '@tanstack/react-query';
import { useState } from 'react';
import { Card } from '../../../components/card.tsx';
import { LinkButton } from '../../../components/link-button.tsx';
import { PageHeader } from '../../../components/page-header.tsx';
import { RouteError } from '../../../components/route-error.tsx';
import { useCheckRuns } from '../../../features/checks/checks.mutations.ts';
import { openQuotesQuery, patternChoicesQuery } from '../../../features/checks/checks.queries.ts';
import { RunsAnswer } from '../../../features/checks/components/runs-answer.tsx';
import { RunsForm, type AskedRuns } from '../../../features/checks/components/runs-form.tsx';
import { sessionQuery } from '../../../features/session/session.queries.ts';
import { queryClient } from '../../../lib/query-client.ts';

export async function loader() {
  await Promise.all([
    queryClient.ensureQueryData(openQuotesQuery()),
    queryClient.ensureQueryData(patternChoicesQuery()),
  ]);
  return null;
}

/** Whether several runs can be made together, from what is on the rack, on order and promised. */
export function Component() {
  const { data: session } = useSuspenseQuery(sessionQuery());
  const again = useCheckRuns();
  const [answer, setAnswer] = useState<{ asked: AskedRuns; check: RunsCheck }>();
  return (
    <>
      <PageHeader
        title="Can we make them?"
        subtitle="One run or several at once: the earlier day is given first"
        action={<LinkButton to="/bench">Back to the bench</LinkButton>}
      />
      <div className="grid items-start gap-5 xl:grid-cols-[minmax(0,26rem)_minmax(0,1fr)]">
        <Card title="The runs" subtitle="a quote, or just so many of a pattern">
          <RunsForm onChecked={(asked, check) => setAnswer({ asked, check })} />
        </Card>
        {answer ? (
          <RunsAnswer
            asked={answer.asked}
            check={answer.check}
            mayOrder={session.person?.role === 'owner'}
            onDrafted={async () => {
              const check = await again.mutateAsync({ body: { runs: answer.asked } });
              setAnswer({ asked: answer.asked, check });
            }}
          />
        ) : (
          <p className="p-4 text-ink-soft">
            The answer stands here: which lots to take, what is short and by when it can be had.
            Nothing is held by asking.
          </p>
        )}
      </div>
    </>
  );
}

export const ErrorBoundary = RouteError;
