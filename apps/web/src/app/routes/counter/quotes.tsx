import { quoteStates, type QuoteState } from '@hidewright/contract';
import { useInfiniteQuery, useSuspenseQuery } from '@tanstack/react-query';
import { useSearchParams } from 'react-router-dom';
import { EmptyState } from '../../../components/empty-state.tsx';
import { LinkButton } from '../../../components/link-button.tsx';
import { PageLoading } from '../../../components/loading.tsx';
import { PageHeader } from '../../../components/page-header.tsx';
import { RouteError } from '../../../components/route-error.tsx';
import { StateFilter } from '../../../components/state-filter.tsx';
import { QuotesTable } from '../../../features/quotes/components/quotes-table.tsx';
import { quotesQuery } from '../../../features/quotes/quotes.queries.ts';
import { sessionQuery } from '../../../features/session/session.queries.ts';
import { queryClient } from '../../../lib/query-client.ts';
import { CounterNav } from './counter-nav.tsx';
import { ShowEarlier } from '../../../components/show-earlier.tsx';

function stateIn(search: URLSearchParams): QuoteState | undefined {
  return quoteStates.find((state) => state === search.get('state'));
}

export async function loader({ request }: { request: Request }) {
  const state = stateIn(new URL(request.url).searchParams);
  await queryClient.ensureInfiniteQueryData(quotesQuery({ state }));
  return null;
}

export function Component() {
  const [search] = useSearchParams();
  const state = stateIn(search);
  const { data: session } = useSuspenseQuery(sessionQuery());
  const { data, hasNextPage, fetchNextPage, isFetchingNextPage } = useInfiniteQuery(
    quotesQuery({ state }),
  );
  if (!data) return <PageLoading />;
  const isOwner = session.person?.role === 'owner';
  const start = isOwner ? (
    <LinkButton to="/counter/quotes/new" tone="primary">
      New quote
    </LinkButton>
  ) : undefined;
  return (
    <>
      <PageHeader title="Quotes" action={start} />
      <CounterNav />
      <StateFilter place="/counter/quotes" states={quoteStates} chosen={state} />
      <QuotesTable
        rows={data.pages.flatMap((page) => page.items)}
        empty={<NoQuotes state={state} isOwner={isOwner} />}
        after={
          <ShowEarlier pages={{ hasNextPage, isFetchingNextPage, fetchNextPage }} what="quotes" />
        }
      />
    </>
  );
}

function NoQuotes({ state, isOwner }: { state: QuoteState | undefined; isOwner: boolean }) {
  if (state !== undefined) return <EmptyState title={`No quote is ${state}.`} />;
  if (!isOwner)
    return (
      <EmptyState title="No quotes yet.">They appear here once the owner drafts one.</EmptyState>
    );
  return (
    <EmptyState
      title="No quotes yet."
      action={
        <>
          <LinkButton to="/counter/quotes/new" tone="primary">
            Draft the first quote
          </LinkButton>
          <LinkButton to="/pattern-room/patterns/new">Make a pattern first</LinkButton>
        </>
      }
    >
      A quote needs a pattern, which says how many pieces the leather gives and how long the work
      takes, and a customer, whom you can add on the way.
    </EmptyState>
  );
}

export const ErrorBoundary = RouteError;
