import type { Leather } from '@hidewright/contract';
import { useInfiniteQuery, useSuspenseQuery } from '@tanstack/react-query';
import { useLoaderData, type LoaderFunctionArgs } from 'react-router-dom';
import { Card } from '../../../components/card.tsx';
import { EmptyState } from '../../../components/empty-state.tsx';
import { KeyFigures } from '../../../components/key-figures.tsx';
import { LinkButton } from '../../../components/link-button.tsx';
import { PageHeader } from '../../../components/page-header.tsx';
import { RouteError } from '../../../components/route-error.tsx';
import { ShowEarlier } from '../../../components/show-earlier.tsx';
import { TextLink } from '../../../components/text-link.tsx';
import { ChangeLeatherForm } from '../../../features/leathers/components/change-leather-form.tsx';
import { leatherDetail } from '../../../features/leathers/leather-words.ts';
import { leatherQuery } from '../../../features/leathers/leathers.queries.ts';
import { LotsTable } from '../../../features/lots/components/lots-table.tsx';
import { lotsQuery } from '../../../features/lots/lots.queries.ts';
import { OffersCard } from '../../../features/supplier-offers/components/offers-card.tsx';
import { supplierOffersQuery } from '../../../lib/supplier-offers.queries.ts';
import { suppliersQuery } from '../../../features/suppliers/suppliers.queries.ts';
import { askedPriceText, rackAreaText } from '../../../lib/formatting.ts';
import { queryClient } from '../../../lib/query-client.ts';
import { areaUnits } from '../../../lib/units.ts';
import { useWorkshop } from '../../../lib/workshop.tsx';
import { choicesOf } from './choices.ts';
import { useRole } from './use-role.ts';

export async function loader({ params }: LoaderFunctionArgs) {
  const id = Number(params['id']);
  const [leather] = await Promise.all([
    queryClient.ensureQueryData(leatherQuery(id)),
    queryClient.ensureQueryData(suppliersQuery()),
    queryClient.ensureQueryData(supplierOffersQuery({ leatherId: id })),
    queryClient.ensureInfiniteQueryData(lotsQuery({ leatherId: id, onRack: 'yes' })),
  ]);
  return leather;
}

export function Component() {
  const { id } = useLoaderData<Leather>();
  const { isOwner, handlesStock } = useRole();
  const { data: leather } = useSuspenseQuery(leatherQuery(id));
  const { data: suppliers } = useSuspenseQuery(suppliersQuery());
  const lots = useInfiniteQuery(lotsQuery({ leatherId: id, onRack: 'yes' }));
  const receive = handlesStock ? (
    <LinkButton to={`/stockroom/receive?leather=${id}`} tone={isOwner ? 'secondary' : 'primary'}>
      Receive a lot
    </LinkButton>
  ) : undefined;
  const order = isOwner ? (
    <LinkButton to={`/stockroom/purchase-orders/new?leather=${id}`} tone="primary">
      Order it
    </LinkButton>
  ) : undefined;
  return (
    <>
      <PageHeader
        title={leather.name}
        subtitle={leatherDetail(leather)}
        action={
          handlesStock && (
            <>
              {receive}
              {order}
            </>
          )
        }
      />
      <div className="grid gap-5">
        <Card title="How much">
          <Facts leather={leather} />
        </Card>
        <Card
          title="Lots on the rack"
          aside={<TextLink to={`/stockroom/ledger?leather=${id}`}>What moved of it</TextLink>}
        >
          <LotsTable
            ofOneLeather
            rows={lots.data?.pages.flatMap((page) => page.items) ?? []}
            empty={
              <EmptyState title="None of it is on the rack." action={receive}>
                A lot hangs here once it is received, with its tag and measured area.
              </EmptyState>
            }
            after={<ShowEarlier pages={lots} what="lots" />}
          />
        </Card>
        <OffersCard
          thing={{ leatherId: id }}
          ownPrice={leather.pricePerFt2}
          suppliers={choicesOf(suppliers.items)}
          isOwner={isOwner}
        />
        {isOwner && (
          <Card title="Change it">
            <ChangeLeatherForm key={id} leather={leather} suppliers={choicesOf(suppliers.items)} />
          </Card>
        )}
      </div>
    </>
  );
}

function Facts({ leather }: { leather: Leather }) {
  const workshop = useWorkshop();
  const { areaUnit, currency } = workshop;
  const { pricePerFt2, supplierName } = leather;
  const price = pricePerFt2 !== undefined && {
    word: `Price, ${currency} per ${areaUnits[areaUnit].sign}`,
    figure: askedPriceText(pricePerFt2, areaUnit),
    note: supplierName ?? undefined,
  };
  return (
    <KeyFigures
      large
      figures={[
        { word: 'On hand', figure: rackAreaText(leather.onHandAreaMm2, workshop) },
        { word: 'Free', figure: rackAreaText(leather.freeAreaMm2, workshop) },
        { word: 'On order', figure: rackAreaText(leather.onOrderAreaMm2, workshop) },
        ...(price === false ? [] : [price]),
      ]}
    />
  );
}

export const ErrorBoundary = RouteError;
