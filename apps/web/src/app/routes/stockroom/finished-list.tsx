import { useQuery } from '@tanstack/react-query';
import { useSearchParams, type LoaderFunctionArgs } from 'react-router-dom';
import { LinkButton } from '../../../components/link-button.tsx';
import { Notice } from '../../../components/notice.tsx';
import { PageHeader } from '../../../components/page-header.tsx';
import { RouteError } from '../../../components/route-error.tsx';
import { TextLink } from '../../../components/text-link.tsx';
import { customerQuery } from '../../../features/customers/customers.queries.ts';
import { FinishedTable } from '../../../features/finished-pieces/components/finished-table.tsx';
import {
  finishedPiecesQuery,
  shelfAsked,
} from '../../../features/finished-pieces/finished-pieces.queries.ts';
import { queryClient } from '../../../lib/query-client.ts';
import { StockroomNav } from './stockroom-nav.tsx';
import { useRole } from './use-role.ts';

function buyerIn(search: URLSearchParams): number | undefined {
  const id = Number(search.get('for'));
  return Number.isSafeInteger(id) && id > 0 ? id : undefined;
}

export async function loader({ request }: LoaderFunctionArgs) {
  const buyer = buyerIn(new URL(request.url).searchParams);
  await queryClient.ensureInfiniteQueryData(finishedPiecesQuery(shelfAsked(buyer)));
  return null;
}

export function Component() {
  const [search] = useSearchParams();
  const { handlesStock, isOwner } = useRole();
  const buyer = isOwner ? buyerIn(search) : undefined;
  return (
    <>
      <PageHeader
        title="Finished pieces"
        subtitle="More than was ordered, and seconds; at what their leather and hardware cost, wages left out"
        action={
          handlesStock && <LinkButton to="/stockroom/finished/new">Put on the shelf</LinkButton>
        }
      />
      <StockroomNav />
      {buyer !== undefined && <ForWhom id={buyer} />}
      <FinishedTable forCustomer={buyer} sells={isOwner} />
    </>
  );
}

function ForWhom({ id }: { id: number }) {
  const { data: customer } = useQuery(customerQuery(id));
  return (
    <Notice className="mb-4">
      What {customer?.name ?? 'this customer'} could have: with their mark, or with nobody’s.{' '}
      <TextLink to="/stockroom/finished">Show the whole shelf</TextLink>
    </Notice>
  );
}

export const ErrorBoundary = RouteError;
