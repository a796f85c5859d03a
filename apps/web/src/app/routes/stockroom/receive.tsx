import type { PurchaseOrder, receiveDelivery, ReplyOf } from '@hidewright/contract';
import { useQuery, useSuspenseQuery } from '@tanstack/react-query';
import { useEffect, useState } from 'react';
import { useLoaderData, useSearchParams, type LoaderFunctionArgs } from 'react-router-dom';
import { Button } from '../../../components/button.tsx';
import { EmptyState } from '../../../components/empty-state.tsx';
import { LinkButton } from '../../../components/link-button.tsx';
import { PageHeader } from '../../../components/page-header.tsx';
import { RouteError } from '../../../components/route-error.tsx';
import { hardwareListQuery } from '../../../features/hardware/hardware.queries.ts';
import { workshopQuery } from '../../../features/office/office.queries.ts';
import { leathersQuery } from '../../../features/leathers/leathers.queries.ts';
import {
  awaitedOrdersQuery,
  purchaseOrderQuery,
} from '../../../features/purchase-orders/purchase-orders.queries.ts';
import { AwaitedOrders } from '../../../features/receiving/components/awaited-orders.tsx';
import { ReceiveForm } from '../../../features/receiving/components/receive-form.tsx';
import { ReceivedSummary } from '../../../features/receiving/components/received-summary.tsx';
import {
  blankDelivery,
  blankHardware,
  blankLot,
  deliveryOf,
} from '../../../features/receiving/typed-delivery.ts';
import { draftKeyAt } from '../../../lib/draft.ts';
import { queryClient } from '../../../lib/query-client.ts';
import { useWorkshop } from '../../../lib/workshop.tsx';
import { focusTitle } from '../../use-focus-after-move.ts';
import { choicesOf } from './choices.ts';
import { useRole } from './use-role.ts';

export async function loader({ request }: LoaderFunctionArgs) {
  const orderId = Number(new URL(request.url).searchParams.get('order'));
  const [order] = await Promise.all([
    orderId > 0 ? queryClient.fetchQuery(purchaseOrderQuery(orderId)) : null,
    queryClient.fetchQuery(awaitedOrdersQuery()),
    queryClient.ensureQueryData(workshopQuery()),
    queryClient.ensureQueryData(leathersQuery()),
    queryClient.ensureQueryData(hardwareListQuery()),
  ]);
  return order;
}

export function Component() {
  const loaded = useLoaderData<PurchaseOrder | null>();
  const [search] = useSearchParams();
  const { data: order = loaded } = useQuery({
    ...purchaseOrderQuery(loaded?.id ?? 0),
    enabled: loaded !== null,
  });
  const [received, setReceived] = useState<ReplyOf<typeof receiveDelivery>>();
  const title = order ? `Receive ${order.number}` : 'Receive a delivery';
  if (received) return <Received received={received} onMore={() => setReceived(undefined)} />;
  return (
    <>
      <PageHeader title={title} subtitle={order?.supplierName} />
      {saysWhat(search) ? (
        <Receiving key={String(search)} asked={order} onReceived={setReceived} />
      ) : (
        <Choosing />
      )}
    </>
  );
}

/** An order, none, or the leather or hardware that somebody began from. */
const saysWhat = (search: URLSearchParams) =>
  ['order', 'leather', 'hardware'].some((name) => search.has(name));

function Choosing() {
  const { data } = useSuspenseQuery(awaitedOrdersQuery());
  // Those without a day come last.
  const day = (order: PurchaseOrder) => order.awaitedOn ?? '9999-12-31';
  return <AwaitedOrders orders={[...data.items].sort((a, b) => day(a).localeCompare(day(b)))} />;
}

interface ReceivingProps {
  asked: PurchaseOrder | null;
  onReceived: (received: ReplyOf<typeof receiveDelivery>) => void;
}

function Receiving({ asked, onReceived }: ReceivingProps) {
  // As it was last looked at, not as it is: neither what is received here nor what others receive pulls the form away.
  const [order, setOrder] = useState(asked);
  const [isOver] = useState(asked !== null && !isAwaited(asked));
  const [search] = useSearchParams();
  const { today } = useWorkshop();
  const { isOwner } = useRole();
  const { data: leathers } = useSuspenseQuery(leathersQuery());
  const { data: hardware } = useSuspenseQuery(hardwareListQuery());
  const { data: workshop } = useSuspenseQuery(workshopQuery());
  if (leathers.items.length + hardware.items.length === 0)
    return <NothingToReceive isOwner={isOwner} />;
  if (order && isOver) {
    return <EmptyState title={`${order.number} is ${order.state}: nothing of it is awaited.`} />;
  }

  async function lookAgain() {
    if (order === null) return undefined;
    const now = await queryClient.fetchQuery({ ...purchaseOrderQuery(order.id), staleTime: 0 });
    setOrder(now);
    return now;
  }

  return (
    <div className="max-w-3xl">
      <ReceiveForm
        order={order ?? undefined}
        draftKey={draftKeyAt('receive', search)}
        defaults={order ? deliveryOf(order, today) : directly(search, today)}
        leathers={choicesOf(leathers.items)}
        hardware={choicesOf(hardware.items.filter(({ parts }) => parts.length === 0))}
        fromCustomer={hardware.items.flatMap((each) => (each.fromCustomer ? each.id : []))}
        tolerancePercent={workshop.areaTolerancePercent}
        mayPrice={isOwner}
        onReceived={onReceived}
        onLookAgain={lookAgain}
      />
    </div>
  );
}

const isAwaited = ({ state }: PurchaseOrder): boolean =>
  state === 'sent' || state === 'part received';

/** Without an order; begun from a leather or from hardware, it has that in it. */
function directly(search: URLSearchParams, today: string) {
  const [leather, hardware] = [Number(search.get('leather')), Number(search.get('hardware'))];
  return {
    ...blankDelivery(today),
    lots: leather > 0 ? [blankLot(leather, null)] : [],
    hardware: hardware > 0 ? [blankHardware(hardware, null)] : [],
  };
}

function NothingToReceive({ isOwner }: { isOwner: boolean }) {
  const add = (
    <LinkButton to="/stockroom/leather/new" tone="primary">
      New leather
    </LinkButton>
  );
  return (
    <EmptyState title="There is nothing to receive yet." action={isOwner ? add : undefined}>
      First the shop needs a leather, or hardware, that a delivery can be of.
    </EmptyState>
  );
}

interface ReceivedProps {
  received: ReplyOf<typeof receiveDelivery>;
  onMore: () => void;
}

function Received({ received, onMore }: ReceivedProps) {
  useEffect(focusTitle, []);
  const order = received.purchaseOrder;
  const open = order === null || order.state === 'part received';
  return (
    <>
      <PageHeader title="Received" subtitle={order && `${order.number} is ${order.state}.`} />
      <div className="max-w-xl space-y-5">
        <ReceivedSummary received={received} />
        <div className="flex flex-wrap gap-2">
          {order ? (
            <LinkButton tone="primary" to={`/stockroom/purchase-orders/${order.id}`}>
              To {order.number}
            </LinkButton>
          ) : (
            <LinkButton tone="primary" to="/stockroom/deliveries">
              To the delivery
            </LinkButton>
          )}
          {open && <Button onClick={onMore}>Receive more</Button>}
        </div>
      </div>
    </>
  );
}

export const ErrorBoundary = RouteError;
