import type { OrderToInvoice } from '@hidewright/contract';
import { LinkButton } from '../../../components/link-button.tsx';
import { StateMark } from '../../../components/state-mark.tsx';
import { Ticket, TicketFact } from '../../../components/ticket.tsx';
import { countText, moneyText } from '../../../lib/formatting.ts';
import { useWorkshop } from '../../../lib/workshop.tsx';

/** Packed or shipped, and nobody has asked for the money yet. */
export function WaitingOrders({ orders }: { orders: readonly OrderToInvoice[] }) {
  const { currency } = useWorkshop();
  if (orders.length === 0) return null;
  return (
    <section aria-labelledby="to-invoice" className="mb-6">
      <h2 id="to-invoice" className="mb-2">
        To be invoiced
      </h2>
      <div className="space-y-2">
        {orders.map((order) => (
          <Ticket
            key={order.orderId}
            level={3}
            number={order.orderNumber}
            title={order.customerName}
            detail={`${countText(order.quantity)} × ${order.title}`}
            facts={
              <>
                <TicketFact word="State">
                  <StateMark state={order.state} />
                </TicketFact>
                <TicketFact word={`Before tax, ${currency}`}>{moneyText(order.total)}</TicketFact>
              </>
            }
            actions={
              <LinkButton to={`/books/invoices/new?order=${order.orderId}`}>
                Invoice<span className="sr-only"> {order.orderNumber}</span>
              </LinkButton>
            }
          />
        ))}
      </div>
    </section>
  );
}
