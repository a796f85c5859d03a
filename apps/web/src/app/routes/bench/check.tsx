import type { Quote } from '@hidewright/contract';
import { useSuspenseQuery } from '@tanstack/react-query';
import { useLoaderData, type LoaderFunctionArgs } from 'react-router-dom';
import { PageHeader } from '../../../components/page-header.tsx';
import { RouteError } from '../../../components/route-error.tsx';
import { CanWeMakeIt } from '../../../features/checks/components/can-we-make-it.tsx';
import { LastTimeCard } from '../../../features/lots/components/last-time-card.tsx';
import { quoteQuery } from '../../../features/quotes/quotes.queries.ts';
import { countText } from '../../../lib/formatting.ts';
import { queryClient } from '../../../lib/query-client.ts';

export async function loader({ params }: LoaderFunctionArgs) {
  return queryClient.ensureQueryData(quoteQuery(Number(params['id'])));
}

/** The maker looks at hides and rivets before a job is accepted. */
export function Component() {
  const { id } = useLoaderData<Quote>();
  const { data: quote } = useSuspenseQuery(quoteQuery(id));
  const quantity = quote.agreedQuantity === null ? '' : `${countText(quote.agreedQuantity)} `;
  return (
    <>
      <PageHeader
        title={quote.title}
        subtitle={`${quote.number}: ${quantity}for ${quote.customerName}`}
      />
      <div className="max-w-3xl space-y-5">
        <LastTimeCard of="quote" id={quote.id} />
        <CanWeMakeIt quoteId={quote.id} by={quote.inHandsOn ?? undefined} />
      </div>
    </>
  );
}

export const ErrorBoundary = RouteError;
