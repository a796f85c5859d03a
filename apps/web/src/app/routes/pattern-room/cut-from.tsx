import type { CutAdviceReply, Pattern } from '@hidewright/contract';
import { useSuspenseQuery } from '@tanstack/react-query';
import { useState } from 'react';
import { useLoaderData, type LoaderFunctionArgs } from 'react-router-dom';
import { Card } from '../../../components/card.tsx';
import { LinkButton } from '../../../components/link-button.tsx';
import { PageHeader } from '../../../components/page-header.tsx';
import { RouteError } from '../../../components/route-error.tsx';
import { CutAdvice } from '../../../features/patterns/components/cut-advice.tsx';
import { CutAdviceForm } from '../../../features/patterns/components/cut-advice-form.tsx';
import { patternQuery } from '../../../features/patterns/patterns.queries.ts';
import { queryClient } from '../../../lib/query-client.ts';

export async function loader({ params }: LoaderFunctionArgs) {
  return queryClient.ensureQueryData(patternQuery(Number(params['id'])));
}

export function Component() {
  const { id } = useLoaderData<Pattern>();
  const { data: pattern } = useSuspenseQuery(patternQuery(id));
  const [advice, setAdvice] = useState<CutAdviceReply>();
  return (
    <>
      <PageHeader
        title={`What to cut ${pattern.name} from`}
        subtitle={`${pattern.description}; ${pattern.leatherName}`}
        action={<LinkButton to={`/pattern-room/patterns/${id}`}>Back to the pattern</LinkButton>}
      />
      <div className="grid items-start gap-5 lg:grid-cols-[minmax(0,22rem)_minmax(0,1fr)]">
        <Card title="The run">
          <CutAdviceForm pattern={pattern} onAdvice={setAdvice} />
        </Card>
        {advice ? (
          <CutAdvice advice={advice} />
        ) : (
          <p className="p-4 text-ink-soft">
            Say how many good pieces the run needs and which panels are on offer: what each costs,
            which strip width takes least leather, and which lots on the rack give enough.
          </p>
        )}
      </div>
    </>
  );
}

export const ErrorBoundary = RouteError;
