import type { Lot } from '@hidewright/contract';
import { useQuery, useSuspenseQuery } from '@tanstack/react-query';
import { useLoaderData, type LoaderFunctionArgs } from 'react-router-dom';
import { Card } from '../../../components/card.tsx';
import { LinkButton } from '../../../components/link-button.tsx';
import { RouteError } from '../../../components/route-error.tsx';
import { PageTitle } from '../../../components/page-title.tsx';
import { TextLink } from '../../../components/text-link.tsx';
import { Ticket } from '../../../components/ticket.tsx';
import { ChangeLotForm } from '../../../features/lots/components/change-lot-form.tsx';
import { patternsQuery } from '../../../features/patterns/patterns.queries.ts';
import { FamilyCard } from '../../../features/lots/components/family-card.tsx';
import { LotFacts } from '../../../features/lots/components/lot-facts.tsx';
import { LayOnLot } from '../../../features/lots/components/lay-on-lot.tsx';
import { SideCard } from '../../../features/lots/components/side-card.tsx';
import { formText } from '../../../features/lots/lot-words.ts';
import { lotDrawingQuery, lotQuery } from '../../../features/lots/lots.queries.ts';
import { MovementsTable } from '../../../features/stock/components/movements-table.tsx';
import { heldQuery, movementsQuery } from '../../../features/stock/stock.queries.ts';
import { queryClient } from '../../../lib/query-client.ts';
import { useWorkshop } from '../../../lib/workshop.tsx';
import { HeldAndAdjust } from './held-and-adjust.tsx';
import { ItemLayout } from './item-layout.tsx';
import { useRole } from './use-role.ts';

export async function loader({ params }: LoaderFunctionArgs) {
  const id = Number(params['id']);
  const lot = await queryClient.ensureQueryData(lotQuery(id));
  await Promise.all([
    queryClient.ensureInfiniteQueryData(movementsQuery({ lotId: id })),
    queryClient.ensureQueryData(heldQuery({ lotId: id })),
  ]);
  return lot;
}

export function Component() {
  const { id } = useLoaderData<Lot>();
  const { isOwner, handlesStock } = useRole();
  const { lengthUnit } = useWorkshop();
  const { data: lot } = useSuspenseQuery(lotQuery(id));
  const item = { lotId: id };
  return (
    <div className="space-y-5">
      <PageTitle>{`Lot ${lot.tag}`}</PageTitle>
      <Ticket
        level={1}
        number={lot.tag}
        title={lot.leatherName}
        detail={formText(lot, lengthUnit)}
        actions={
          handlesStock && (
            <>
              <LinkButton to={`/stockroom/tags?lots=${id}`}>Print its tag</LinkButton>
              {isOwner && lot.freeAreaMm2 !== '0' && (
                <LinkButton to={`/stockroom/purchase-orders/new?lot=${id}`}>
                  Have it worked on
                </LinkButton>
              )}
            </>
          )
        }
      />
      <ItemLayout
        facts={
          <Card title="What is left">
            <LotFacts lot={lot} />
          </Card>
        }
        aside={<HeldAndAdjust item={item} onHand={lot.onHandAreaMm2} handlesStock={handlesStock} />}
      >
        {handlesStock && lot.form !== 'panel' && lot.form !== 'strip' && (
          <>
            <SideCard lot={lot} />
            <WhatItGives lotId={lot.id} leatherName={lot.leatherName} />
          </>
        )}
        <FamilyCard lotId={id} handlesStock={handlesStock} />
        <Card
          title="Movements"
          aside={<TextLink to={`/stockroom/ledger?lot=${id}`}>In the ledger</TextLink>}
        >
          <MovementsTable item={item} />
        </Card>
        {handlesStock && (
          <Card title="Where it lies and what is noted of it">
            <ChangeLotForm key={id} lot={lot} />
          </Card>
        )}
      </ItemLayout>
    </div>
  );
}

/** Once it is drawn: laying the patterns of its leather on it. */
function WhatItGives({ lotId, leatherName }: { lotId: number; leatherName: string }) {
  const { data: drawing } = useQuery(lotDrawingQuery(lotId));
  const { data: patterns } = useQuery(patternsQuery());
  if (!drawing?.outline || !patterns) return null;
  const drawn = patterns.items.filter(
    (pattern) =>
      pattern.active && pattern.outlinePath !== null && pattern.leatherName === leatherName,
  );
  return (
    <LayOnLot
      key={drawing.version}
      lotId={lotId}
      patterns={drawn.map(({ id, name }) => ({ value: id, label: name }))}
    />
  );
}

export const ErrorBoundary = RouteError;
