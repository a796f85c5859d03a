import type { Quote } from '@hidewright/contract';
import type { ReactNode } from 'react';
import { StateMark } from '../../../components/state-mark.tsx';
import { Ticket, TicketFact } from '../../../components/ticket.tsx';
import { dayText } from '../../../lib/formatting.ts';
import { useWorkshop } from '../../../lib/workshop.tsx';

/** The head of the quote's screen. */
export function QuoteTicket({ quote, actions }: { quote: Quote; actions?: ReactNode }) {
  const { today } = useWorkshop();
  return (
    <Ticket
      level={1}
      number={quote.number}
      title={quote.customerName}
      detail={
        quote.title === quote.patternName
          ? quote.title
          : `${quote.title} · pattern ${quote.patternName}`
      }
      facts={
        <>
          {quote.inHandsOn && (
            <TicketFact word="in hands">{dayText(quote.inHandsOn, today)}</TicketFact>
          )}
          {quote.validUntil && (
            <TicketFact word="good until">{dayText(quote.validUntil, today)}</TicketFact>
          )}
          <TicketFact word="state">
            <StateMark state={quote.state}>{wordFor(quote)}</StateMark>
          </TicketFact>
        </>
      }
      actions={actions}
    />
  );
}

/** "draft 2": the state, and which revision where there is more than one. */
function wordFor({ state, revision }: Quote): string {
  return revision === 1 ? state : `${state} ${revision}`;
}
