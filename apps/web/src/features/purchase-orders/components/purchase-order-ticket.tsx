import type { PurchaseOrder } from '@hidewright/contract';
import type { ReactNode } from 'react';
import { Ticket, TicketFact } from '../../../components/ticket.tsx';
import { dayText, instantText, moneyText } from '../../../lib/formatting.ts';
import { useWorkshop } from '../../../lib/workshop.tsx';
import { OrderState } from './order-state.tsx';

interface PurchaseOrderTicketProps {
  order: PurchaseOrder;
  actions?: ReactNode;
}

export function PurchaseOrderTicket({ order, actions }: PurchaseOrderTicketProps) {
  const { currency, today, timeZone } = useWorkshop();
  const { number, supplierName, state, sentAt, total } = order;
  const told = state === 'cancelled' ? null : order.expectedOn;
  const expectedOn = order.awaitedOn ?? order.arrivesOn ?? told;
  return (
    <Ticket
      level={1}
      number={number}
      title={supplierName}
      detail={sentAt === null ? 'not sent yet' : `sent ${instantText(sentAt, timeZone)}`}
      facts={
        <>
          <TicketFact word="State">
            <OrderState order={order} />
          </TicketFact>
          {expectedOn !== null && (
            <TicketFact word={order.arrivesOn === null ? 'Expected' : 'Expected, if sent today'}>
              {dayText(expectedOn, today)}
            </TicketFact>
          )}
          {total !== undefined && (
            <TicketFact word={`Total, ${currency}`}>{moneyText(total)}</TicketFact>
          )}
        </>
      }
      actions={actions}
    />
  );
}
