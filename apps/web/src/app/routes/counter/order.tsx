import type { Order } from '@hidewright/contract';
import { useSuspenseQuery } from '@tanstack/react-query';
import { useLoaderData, type LoaderFunctionArgs } from 'react-router-dom';
import { CancelledNotice } from '../../../components/cancelled-notice.tsx';
import { Card } from '../../../components/card.tsx';
import { KeyFigures } from '../../../components/key-figures.tsx';
import { LinkButton } from '../../../components/link-button.tsx';
import { RouteError } from '../../../components/route-error.tsx';
import { StateMark } from '../../../components/state-mark.tsx';
import { TextLink } from '../../../components/text-link.tsx';
import { CutFromCard } from '../../../features/lots/components/cut-from-card.tsx';
import { Arrivals } from '../../../features/orders/components/arrivals.tsx';
import { CancelOrder } from '../../../features/orders/components/cancel-order.tsx';
import { ChangesCard } from '../../../features/orders/components/changes-card.tsx';
import { MoveDay } from '../../../features/orders/components/move-day.tsx';
import { OrderFigures } from '../../../features/orders/components/order-figures.tsx';
import { OrderTicket } from '../../../features/orders/components/order-ticket.tsx';
import { ShipForm } from '../../../features/orders/components/ship-form.tsx';
import { orderQuery } from '../../../features/orders/orders.queries.ts';
import { sessionQuery } from '../../../features/session/session.queries.ts';
import { countText } from '../../../lib/formatting.ts';
import { queryClient } from '../../../lib/query-client.ts';

export async function loader({ params }: LoaderFunctionArgs) {
  return queryClient.ensureQueryData(orderQuery(Number(params['id'])));
}

export function Component() {
  const { id } = useLoaderData<Order>();
  const { data: order } = useSuspenseQuery(orderQuery(id));
  const { data: session } = useSuspenseQuery(sessionQuery());
  const role = session.person?.role;
  return (
    <div className="space-y-5">
      <OrderTicket
        order={order}
        actions={
          <>
            {role !== 'maker' && <InvoiceAction order={order} />}
            {role === 'owner' && <ChangeActions order={order} />}
          </>
        }
      />
      <CancelledNotice
        cancellation={order.cancellation}
        actions={
          role === 'owner' && (
            <LinkButton
              to={`/counter/quotes/new?customer=${order.customerId}&pattern=${order.patternId}`}
            >
              Write another quote
            </LinkButton>
          )
        }
      />
      <div className="grid items-start gap-5 lg:grid-cols-2">
        <Arrivals order={order} canNote={role === 'owner'} />
        <JobCard order={order} canOpen={role !== 'bookkeeper'} />
        <CutFromCard orderId={order.id} mayOpenOrders={role !== 'bookkeeper'} />
        <OrderFigures order={order} />
        <ChangesCard order={order} />
        {order.state === 'packed' && role !== 'bookkeeper' && <ShipForm order={order} />}
        <Card title="Where it comes from">
          <p>
            <TextLink to={`/counter/quotes/${order.quoteId}`}>{order.quoteNumber}</TextLink>, made
            from {order.patternName}.
          </p>
          <p className="mt-2">
            <TextLink to={`/stockroom/ledger?order=${id}`}>What the stockroom gave for it</TextLink>
          </p>
        </Card>
      </div>
    </div>
  );
}

/** As long as something of it is still to come. */
function ChangeActions({ order }: { order: Order }) {
  if (['shipped', 'closed', 'cancelled'].includes(order.state)) return null;
  return (
    <>
      <MoveDay order={order} />
      {order.state !== 'part shipped' && <CancelOrder order={order} />}
    </>
  );
}

/** Once it is packed it can be invoiced. */
function InvoiceAction({ order }: { order: Order }) {
  const { invoice } = order;
  if (invoice)
    return (
      <LinkButton to={`/books/invoices/${invoice.id}`}>
        Invoice {invoice.number ?? 'draft'}
      </LinkButton>
    );
  if (!['packed', 'part shipped', 'shipped'].includes(order.state)) return null;
  return (
    <LinkButton tone="primary" to={`/books/invoices/new?order=${order.id}`}>
      Invoice it
    </LinkButton>
  );
}

function JobCard({ order, canOpen }: { order: Order; canOpen: boolean }) {
  const { job } = order;
  return (
    <Card
      title={`Ticket ${job.number}`}
      aside={canOpen && <TextLink to={`/bench/jobs/${job.id}`}>Open the ticket</TextLink>}
    >
      <KeyFigures
        figures={[
          {
            word: 'State',
            figure: <StateMark state={order.state === 'cancelled' ? 'cancelled' : job.state} />,
          },
          { word: 'To cut', figure: countText(job.cutCount) },
          ...(job.state === 'finished'
            ? [
                { word: 'Good', figure: countText(job.good) },
                { word: 'Seconds', figure: countText(job.seconds) },
              ]
            : []),
        ]}
      />
    </Card>
  );
}

export const ErrorBoundary = RouteError;
