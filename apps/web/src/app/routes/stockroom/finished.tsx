import type { FinishedPiece } from '@hidewright/contract';
import { useSuspenseQuery } from '@tanstack/react-query';
import { useLoaderData, type LoaderFunctionArgs } from 'react-router-dom';
import { Card } from '../../../components/card.tsx';
import { LinkButton } from '../../../components/link-button.tsx';
import { PageHeader } from '../../../components/page-header.tsx';
import { RouteError } from '../../../components/route-error.tsx';
import { CountFinishedForm } from '../../../features/finished-pieces/components/count-finished-form.tsx';
import { FinishedFacts } from '../../../features/finished-pieces/components/finished-facts.tsx';
import { FinishedMovements } from '../../../features/finished-pieces/components/finished-movements.tsx';
import { PlaceForm } from '../../../features/finished-pieces/components/place-form.tsx';
import { TakeFinishedForm } from '../../../features/finished-pieces/components/take-finished-form.tsx';
import {
  finishedMovementsQuery,
  finishedPieceQuery,
} from '../../../features/finished-pieces/finished-pieces.queries.ts';
import { finishedName } from '../../../features/finished-pieces/finished-words.ts';
import { queryClient } from '../../../lib/query-client.ts';
import { ItemLayout } from './item-layout.tsx';
import { useRole } from './use-role.ts';

export async function loader({ params }: LoaderFunctionArgs) {
  const id = Number(params['id']);
  const [piece] = await Promise.all([
    queryClient.ensureQueryData(finishedPieceQuery(id)),
    queryClient.ensureInfiniteQueryData(finishedMovementsQuery(id)),
  ]);
  return piece;
}

export function Component() {
  const { id } = useLoaderData<FinishedPiece>();
  const { data: piece } = useSuspenseQuery(finishedPieceQuery(id));
  const { handlesStock, isOwner } = useRole();
  return (
    <>
      <PageHeader
        title={finishedName(piece)}
        action={
          isOwner &&
          piece.onHand > 0 && (
            <LinkButton to={`/stockroom/finished/${id}/sell`} tone="primary">
              Sell with an invoice
            </LinkButton>
          )
        }
      />
      <ItemLayout
        facts={<FinishedFacts piece={piece} />}
        aside={handlesStock && <Hands piece={piece} />}
      >
        <Card title="What came and left">
          <FinishedMovements id={id} />
        </Card>
      </ItemLayout>
    </>
  );
}

function Hands({ piece }: { piece: FinishedPiece }) {
  return (
    <>
      <Card title="Take from the shelf" subtitle="without an invoice">
        <TakeFinishedForm key={piece.id} piece={piece} />
      </Card>
      <Card title="Count" subtitle="to what is really there">
        <CountFinishedForm key={piece.id} piece={piece} />
      </Card>
      <Card title="Where they lie">
        <PlaceForm key={piece.id} piece={piece} />
      </Card>
    </>
  );
}

export const ErrorBoundary = RouteError;
