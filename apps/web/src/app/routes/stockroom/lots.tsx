import { useInfiniteQuery } from '@tanstack/react-query';
import { useSearchParams, type LoaderFunctionArgs } from 'react-router-dom';
import { EmptyState } from '../../../components/empty-state.tsx';
import { LinkButton } from '../../../components/link-button.tsx';
import { PageLoading } from '../../../components/loading.tsx';
import { PageHeader } from '../../../components/page-header.tsx';
import { RouteError } from '../../../components/route-error.tsx';
import { TextLink } from '../../../components/text-link.tsx';
import { LotsTable } from '../../../features/lots/components/lots-table.tsx';
import { lotsQuery } from '../../../features/lots/lots.queries.ts';
import { queryClient } from '../../../lib/query-client.ts';
import { StockroomNav } from './stockroom-nav.tsx';
import { useRole } from './use-role.ts';
import { ShowEarlier } from '../../../components/show-earlier.tsx';

const wanted = (search: URLSearchParams) =>
  search.get('show') === 'all' ? {} : { ours: 'yes' as const };

export async function loader({ request }: LoaderFunctionArgs) {
  await queryClient.ensureInfiniteQueryData(lotsQuery(wanted(new URL(request.url).searchParams)));
  return null;
}

export function Component() {
  const [search] = useSearchParams();
  const { handlesStock } = useRole();
  const { data, hasNextPage, fetchNextPage, isFetchingNextPage } = useInfiniteQuery(
    lotsQuery(wanted(search)),
  );
  if (!data) return <PageLoading />;
  const all = search.get('show') === 'all';
  const receive = handlesStock ? (
    <>
      <LinkButton to="/stockroom/tags">Print tags</LinkButton>
      <LinkButton to="/stockroom/receive" tone="primary">
        Receive a delivery
      </LinkButton>
    </>
  ) : undefined;
  return (
    <>
      <PageHeader title="Lots" action={receive} />
      <StockroomNav />
      <LotsTable
        rows={data.pages.flatMap((page) => page.items)}
        empty={
          <EmptyState title={all ? 'No lots yet.' : 'Nothing is on the rack.'} action={receive}>
            Each side, hide or bundle that comes in becomes a lot with a tag and a measured area.
          </EmptyState>
        }
        after={
          <ShowEarlier pages={{ hasNextPage, isFetchingNextPage, fetchNextPage }} what="lots" />
        }
      />
      <p className="mt-4">
        <TextLink to={all ? '/stockroom/lots' : '/stockroom/lots?show=all'}>
          {all ? 'Only what is on the rack or out' : 'With what is used up'}
        </TextLink>
      </p>
    </>
  );
}

export const ErrorBoundary = RouteError;
