import type { Order } from '@hidewright/contract';
import type { ReactNode } from 'react';
import { PageTitle } from '../../../components/page-title.tsx';
import { StateMark } from '../../../components/state-mark.tsx';
import { Ticket, TicketFact } from '../../../components/ticket.tsx';
import { countText, dayText } from '../../../lib/formatting.ts';
import { useWorkshop } from '../../../lib/workshop.tsx';

export function OrderTicket({ order, actions }: { order: Order; actions?: ReactNode }) {
  const { today } = useWorkshop();
  return (
    <>
      <PageTitle>{`${order.number} ${order.title}`}</PageTitle>
      <Ticket
        number={order.number}
        title={order.title}
        level={1}
        detail={`${countText(order.quantity)} for ${order.customerName}`}
        facts={
          <>
            <TicketFact word="State">
              <StateMark state={order.state} />
            </TicketFact>
            <TicketFact word="Promised">{dayText(order.promisedOn, today)}</TicketFact>
            {order.inHandsOn !== null && <TicketFact word="In hands">{dayText(order.inHandsOn, today)}</TicketFact>}
            {order.shippedOn !== null && <TicketFact word="Shipped">{dayText(order.shippedOn, today)}</TicketFact>}
          </>
        }
        actions={actions}
      />
    </>
  );
}
