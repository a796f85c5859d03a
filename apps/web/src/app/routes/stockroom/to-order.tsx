import { useSuspenseQuery } from '@tanstack/react-query';
import { useSearchParams, type LoaderFunctionArgs } from 'react-router-dom';
import { EmptyState } from '../../../components/empty-state.tsx';
import { LinkButton } from '../../../components/link-button.tsx';
import { PageHeader } from '../../../components/page-header.tsx';
import { RouteError } from '../../../components/route-error.tsx';
import { ToOrderList } from '../../../features/to-order/components/to-order-list.tsx';
import { UnclearNotice } from '../../../features/to-order/components/unclear-notice.tsx';
import { toOrderQuery } from '../../../features/to-order/to-order.queries.ts';
import { queryClient } from '../../../lib/query-client.ts';
import { StockroomNav } from './stockroom-nav.tsx';
import { useRole } from './use-role.ts';

const shown = (search: URLSearchParams) => (search.get('show') === 'all' ? 'all' : 'due');

export async function loader({ request }: LoaderFunctionArgs) {
  await queryClient.ensureQueryData(toOrderQuery(shown(new URL(request.url).searchParams)));
  return null;
}

/** What should be ordered now and what soon, and why. */
export function Component() {
  const [search] = useSearchParams();
  const show = shown(search);
  const { isOwner } = useRole();
  const { data } = useSuspenseQuery(toOrderQuery(show));
  const { items, fine, unclear, orderCost, holdingPercent, servicePercent } = data;
  return (
    <>
      <PageHeader
        title="To order"
        subtitle={`${countedWords(items.length - (show === 'all' ? fine : 0))} due, ${fine} fine`}
        action={
          show === 'all' ? (
            <LinkButton to="/stockroom/to-order">Only what is due</LinkButton>
          ) : (
            fine > 0 && <LinkButton to="?show=all">Show what is fine too</LinkButton>
          )
        }
      />
      <StockroomNav />
      <UnclearNotice things={unclear} />
      {items.length === 0 ? (
        <EmptyState title="Nothing has to be ordered.">
          {fine > 0
            ? 'Of everything that is bought there is enough, or it is on its way.'
            : 'Add leather, hardware or supplies with a minimum: what falls below it is listed here.'}
        </EmptyState>
      ) : (
        <ToOrderList
          items={items}
          mayOrder={isOwner}
          {...{ orderCost, holdingPercent, servicePercent }}
        />
      )}
    </>
  );
}

const countedWords = (due: number): string =>
  due === 0 ? 'Nothing is' : `${due} ${due === 1 ? 'thing is' : 'things are'}`;

export const ErrorBoundary = RouteError;
