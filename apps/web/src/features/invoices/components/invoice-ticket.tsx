import type { Invoice } from '@hidewright/contract';
import type { ReactNode } from 'react';
import { PageTitle } from '../../../components/page-title.tsx';
import { TextLink } from '../../../components/text-link.tsx';
import { Ticket, TicketFact } from '../../../components/ticket.tsx';
import { dayText, moneyText } from '../../../lib/formatting.ts';
import { useWorkshop } from '../../../lib/workshop.tsx';
import { InvoiceStateMark } from './invoice-state.tsx';

export function InvoiceTicket({ invoice, actions }: { invoice: Invoice; actions: ReactNode }) {
  const { today } = useWorkshop();
  const { number, issuedOn, dueOn, currency } = invoice;
  const isDraft = invoice.state === 'draft';
  return (
    <>
      <PageTitle>{`${number ?? 'Draft invoice'} ${invoice.customerName}`}</PageTitle>
      <Ticket
        level={1}
        number={number ?? 'Draft invoice'}
        title={invoice.customerName}
        detail={
          <>
            {invoice.title}
            {invoice.orderId !== null && (
              <>
                {', '}
                <TextLink to={`/counter/orders/${invoice.orderId}`}>{invoice.orderNumber}</TextLink>
              </>
            )}
          </>
        }
        facts={
          <>
            <TicketFact word="State">
              <InvoiceStateMark invoice={invoice} />
            </TicketFact>
            {issuedOn !== null && <TicketFact word="Issued">{dayText(issuedOn, today)}</TicketFact>}
            {dueOn !== null && <TicketFact word="Due">{dayText(dueOn, today)}</TicketFact>}
            <TicketFact word={`Total, ${currency}`}>{moneyText(invoice.total)}</TicketFact>
            {!isDraft && <TicketFact word="Open">{moneyText(invoice.open)}</TicketFact>}
          </>
        }
        actions={actions}
      />
    </>
  );
}
