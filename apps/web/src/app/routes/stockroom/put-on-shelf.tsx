import { useQuery, useSuspenseQuery } from '@tanstack/react-query';
import { useNavigate } from 'react-router-dom';
import { Card } from '../../../components/card.tsx';
import { PageHeader } from '../../../components/page-header.tsx';
import { RouteError } from '../../../components/route-error.tsx';
import { say } from '../../../components/toast.ts';
import { customersQuery } from '../../../features/customers/customers.queries.ts';
import { PutOnShelfForm } from '../../../features/finished-pieces/components/put-on-shelf-form.tsx';
import { finishedName } from '../../../features/finished-pieces/finished-words.ts';
import { patternsQuery } from '../../../features/patterns/patterns.queries.ts';
import { countText } from '../../../lib/formatting.ts';
import { queryClient } from '../../../lib/query-client.ts';
import { choicesOf } from './choices.ts';
import { useRole } from './use-role.ts';

export async function loader() {
  await queryClient.ensureQueryData(patternsQuery());
  return null;
}

export function Component() {
  const navigate = useNavigate();
  const { isOwner } = useRole();
  const { data: patterns } = useSuspenseQuery(patternsQuery());
  const { data: customers } = useQuery({ ...customersQuery(), enabled: isOwner });
  return (
    <>
      <PageHeader
        title="Put on the shelf"
        subtitle="Pieces that no job put there: found, or there before the books began"
      />
      <Card>
        <PutOnShelfForm
          patterns={choicesOf(patterns.items)}
          customers={customers && choicesOf(customers.items)}
          isOwner={isOwner}
          onPut={(piece, quantity) => {
            say(`${countText(quantity)} of ${finishedName(piece)} are put on the shelf.`);
            void navigate(`/stockroom/finished/${piece.id}`);
          }}
        />
      </Card>
    </>
  );
}

export const ErrorBoundary = RouteError;
