import type { Pattern } from '@hidewright/contract';
import { useSuspenseQuery } from '@tanstack/react-query';
import { useLoaderData, useSearchParams, type LoaderFunctionArgs } from 'react-router-dom';
import { Card } from '../../../components/card.tsx';
import { LinkButton } from '../../../components/link-button.tsx';
import { PageHeader } from '../../../components/page-header.tsx';
import { RouteError } from '../../../components/route-error.tsx';
import { patternQuery } from '../../../features/patterns/patterns.queries.ts';
import { ToolingAdvice } from '../../../features/tools/components/tooling-advice.tsx';
import {
  ToolingRunForm,
  type TypedRun,
} from '../../../features/tools/components/tooling-run-form.tsx';
import { customerChoicesQuery } from '../../../features/tools/tools.queries.ts';
import { queryClient } from '../../../lib/query-client.ts';

export async function loader({ params }: LoaderFunctionArgs) {
  const [pattern] = await Promise.all([
    queryClient.ensureQueryData(patternQuery(Number(params['id']))),
    queryClient.ensureQueryData(customerChoicesQuery()),
  ]);
  return pattern;
}

const names = ['customerId', 'pieces', 'runs', 'runPieces'] as const;

export function Component() {
  const { id } = useLoaderData<Pattern>();
  const { data: pattern } = useSuspenseQuery(patternQuery(id));
  const [search, setSearch] = useSearchParams();
  const run = runFrom(search);
  return (
    <>
      <PageHeader
        title={`Tooling for ${pattern.name}`}
        subtitle="What is there for a run, whether it lasts, and which metal a new plate should be"
        action={<LinkButton to={`/pattern-room/patterns/${id}`}>Back to the pattern</LinkButton>}
      />
      <div className="grid items-start gap-5 lg:grid-cols-[minmax(0,22rem)_minmax(0,1fr)]">
        <Card title="The run">
          <ToolingRunForm
            run={run}
            onRun={(typed) => setSearch(searchFor(typed), { replace: true })}
          />
        </Card>
        {run.pieces === undefined ? (
          <p className="p-4 text-ink-soft">
            Say how many pieces are cut and for whom: which die and plate are there for them, how
            long they last, and what a new plate of each metal would cost.
          </p>
        ) : (
          <ToolingAdvice open patternId={id} {...run} pieces={run.pieces} />
        )}
      </div>
    </>
  );
}

/** The run that the address tells; what is no whole number there is left out. */
function runFrom(search: URLSearchParams): Partial<TypedRun> {
  const told = names.flatMap((name) => {
    const text = search.get(name) ?? '';
    return /^\d{1,9}$/.test(text) ? [[name, Number(text)] as const] : [];
  });
  return Object.fromEntries(told);
}

function searchFor(run: TypedRun): Record<string, string> {
  const told = names.flatMap((name) => {
    const value = run[name];
    return value === undefined ? [] : [[name, String(value)] as const];
  });
  return Object.fromEntries(told);
}

export const ErrorBoundary = RouteError;
