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
              <span className="flex flex-wrap gap-1.5">
                {statesOf(order).map((state) => (
                  <StateMark key={state} state={state} />
                ))}
              </span>
            </TicketFact>
            <TicketFact word="Promised">{dayText(order.promisedOn, today)}</TicketFact>
            {order.moves[0] !== undefined && (
              <TicketFact word="Promised first">
                {dayText(order.moves[0].fromDay, today)}
              </TicketFact>
            )}
            {order.inHandsOn !== null && (
              <TicketFact word="In hands">{dayText(order.inHandsOn, today)}</TicketFact>
            )}
            {order.shippedOn !== null && (
              <TicketFact word="Shipped">{dayText(order.shippedOn, today)}</TicketFact>
            )}
          </>
        }
        actions={actions}
      />
    </>
  );
}

/** What is awaited shows as several at once. */
const statesOf = ({ awaits, state }: Order): string[] =>
  awaits.length > 0 ? awaits.map((what) => `awaiting ${what}`) : [state];
