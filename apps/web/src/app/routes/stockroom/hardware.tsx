import type { Hardware } from '@hidewright/contract';
import { kitWords } from '@hidewright/domain';
import { useSuspenseQuery } from '@tanstack/react-query';
import { useLoaderData, type LoaderFunctionArgs } from 'react-router-dom';
import { Card } from '../../../components/card.tsx';
import { LinkButton } from '../../../components/link-button.tsx';
import { PageHeader } from '../../../components/page-header.tsx';
import { RouteError } from '../../../components/route-error.tsx';
import { StateMark } from '../../../components/state-mark.tsx';
import { TextLink } from '../../../components/text-link.tsx';
import { ChangeHardwareForm } from '../../../features/hardware/components/change-hardware-form.tsx';
import { HardwareFacts } from '../../../features/hardware/components/hardware-facts.tsx';
import {
  hasRelated,
  RelatedHardware,
} from '../../../features/hardware/components/related-hardware.tsx';
import { hardwareQuery } from '../../../features/hardware/hardware.queries.ts';
import { MovementsTable } from '../../../features/stock/components/movements-table.tsx';
import { heldQuery, movementsQuery } from '../../../features/stock/stock.queries.ts';
import { OffersCard } from '../../../features/supplier-offers/components/offers-card.tsx';
import { supplierOffersQuery } from '../../../lib/supplier-offers.queries.ts';
import { suppliersQuery } from '../../../features/suppliers/suppliers.queries.ts';
import { queryClient } from '../../../lib/query-client.ts';
import { choicesOf } from './choices.ts';
import { HeldAndAdjust } from './held-and-adjust.tsx';
import { ItemLayout } from './item-layout.tsx';
import { useRole } from './use-role.ts';

export async function loader({ params }: LoaderFunctionArgs) {
  const id = Number(params['id']);
  const hardware = await queryClient.ensureQueryData(hardwareQuery(id));
  await Promise.all([
    queryClient.ensureQueryData(suppliersQuery()),
    queryClient.ensureQueryData(supplierOffersQuery({ hardwareId: id })),
    queryClient.ensureInfiniteQueryData(movementsQuery({ hardwareId: id })),
    queryClient.ensureQueryData(heldQuery({ hardwareId: id })),
  ]);
  return hardware;
}

export function Component() {
  const { id } = useLoaderData<Hardware>();
  const { isOwner, handlesStock } = useRole();
  const { data: hardware } = useSuspenseQuery(hardwareQuery(id));
  const { data: suppliers } = useSuspenseQuery(suppliersQuery());
  const item = { hardwareId: id };
  const isKit = hardware.parts.length > 0;
  return (
    <>
      <PageHeader
        title={hardware.name}
        subtitle={hardware.short ? <StateMark state="short" /> : kindWords(hardware)}
        action={handlesStock && !isKit && <Actions hardware={hardware} isOwner={isOwner} />}
      />
      <ItemLayout
        facts={
          <Card title="How many">
            <HardwareFacts hardware={hardware} />
          </Card>
        }
        aside={
          <>
            {hasRelated(hardware) && (
              <Card title={isKit ? 'A kit' : 'Together with'}>
                <RelatedHardware hardware={hardware} />
              </Card>
            )}
            {!isKit && (
              <HeldAndAdjust
                item={item}
                onHand={hardware.onHand}
                unit={hardware.unit}
                handlesStock={handlesStock}
              />
            )}
          </>
        }
      >
        {!isKit && !hardware.fromCustomer && (
          <OffersCard
            thing={item}
            ownPrice={hardware.unitPrice}
            suppliers={choicesOf(suppliers.items)}
            isOwner={isOwner}
          />
        )}
        {!isKit && (
          <Card
            title="Movements"
            aside={<TextLink to={`/stockroom/ledger?hardware=${id}`}>In the ledger</TextLink>}
          >
            <MovementsTable item={item} />
          </Card>
        )}
        {isOwner && (
          <Card title="Change it">
            <ChangeHardwareForm
              key={id}
              hardware={hardware}
              suppliers={choicesOf(suppliers.items)}
            />
          </Card>
        )}
      </ItemLayout>
    </>
  );
}

const kindWords = ({ kind, parts }: Hardware): string =>
  parts.length > 0 ? `${kind}, ${kitWords(parts)}` : kind;

function Actions({ hardware, isOwner }: { hardware: Hardware; isOwner: boolean }) {
  const { id, fromCustomer } = hardware;
  return (
    <>
      <LinkButton to={`/stockroom/receive?hardware=${id}`} tone={isOwner ? 'secondary' : 'primary'}>
        Receive
      </LinkButton>
      {isOwner && !fromCustomer && (
        <LinkButton to={`/stockroom/purchase-orders/new?hardware=${id}`} tone="primary">
          Order it
        </LinkButton>
      )}
    </>
  );
}

export const ErrorBoundary = RouteError;
