import type { PurchaseOrder } from '@hidewright/contract';
import { useSuspenseQuery } from '@tanstack/react-query';
import { useLoaderData, type LoaderFunctionArgs } from 'react-router-dom';
import { CancelledNotice } from '../../../components/cancelled-notice.tsx';
import { Card } from '../../../components/card.tsx';
import { PageTitle } from '../../../components/page-title.tsx';
import { RouteError } from '../../../components/route-error.tsx';
import { TextLink } from '../../../components/text-link.tsx';
import { ClaimsCard } from '../../../features/purchase-orders/components/claims-card.tsx';
import { OrderActions } from '../../../features/purchase-orders/components/order-actions.tsx';
import { OrderRemarksNotice } from '../../../features/purchase-orders/components/order-remarks-notice.tsx';
import { PurchaseLinesTable } from '../../../features/purchase-orders/components/purchase-lines-table.tsx';
import { PurchaseOrderTicket } from '../../../features/purchase-orders/components/purchase-order-ticket.tsx';
import { ReceiptCard } from '../../../features/purchase-orders/components/receipt-card.tsx';
import { ReturnsCard } from '../../../features/purchase-orders/components/returns-card.tsx';
import {
  purchaseOrderQuery,
  receiptsQuery,
} from '../../../features/purchase-orders/purchase-orders.queries.ts';
import { queryClient } from '../../../lib/query-client.ts';
import { useRole } from './use-role.ts';

export async function loader({ params }: LoaderFunctionArgs) {
  const id = Number(params['id']);
  const [order] = await Promise.all([
    queryClient.ensureQueryData(purchaseOrderQuery(id)),
    queryClient.ensureQueryData(receiptsQuery(id)),
  ]);
  return order;
}

export function Component() {
  const { id } = useLoaderData<PurchaseOrder>();
  const { role, isOwner, handlesStock } = useRole();
  const { data: order } = useSuspenseQuery(purchaseOrderQuery(id));
  const { data: receipts } = useSuspenseQuery(receiptsQuery(id));
  return (
    <div className="space-y-5">
      <PageTitle>{`${order.number}, ${order.supplierName}`}</PageTitle>
      <PurchaseOrderTicket
        order={order}
        actions={
          <OrderActions
            order={order}
            isOwner={isOwner}
            mayReceive={handlesStock}
            maySeePrices={role !== 'maker'}
          />
        }
      />
      <CancelledNotice cancellation={order.cancellation} />
      <Card
        title="What is ordered"
        aside={
          order.receipts > 0 && (
            <TextLink to={`/stockroom/ledger?purchase=${id}`}>What moved for it</TextLink>
          )
        }
      >
        {isOwner && order.state === 'draft' && <OrderRemarksNotice order={order} />}
        <PurchaseLinesTable order={order} isOwner={isOwner} />
        {order.draftedFor !== '' && (
          <p className="mt-4 text-ink-soft">{`Drafted for ${order.draftedFor}; the supplier is not told.`}</p>
        )}
      </Card>
      {order.note !== '' && (
        <Card title="Note to the supplier">
          <p className="max-w-prose whitespace-pre-line">{order.note}</p>
        </Card>
      )}
      {receipts.items.map((receipt, at) => (
        <ReceiptCard
          key={receipt.id}
          receipt={receipt}
          of={{ order, count: receipts.items.length - at }}
          isOwner={isOwner}
        />
      ))}
      {role !== 'maker' && <ClaimsCard orderId={id} isOwner={isOwner} />}
      <ReturnsCard orderId={id} receipts={receipts.items} isOwner={isOwner} />
    </div>
  );
}

export const ErrorBoundary = RouteError;
