import { useSuspenseQuery } from '@tanstack/react-query';
import { SectionNav, type SectionLink } from '../../../components/section-nav.tsx';
import { sessionQuery } from '../../../features/session/session.queries.ts';

const quotes: SectionLink = { to: '/counter/quotes', word: 'Quotes' };
const orders: SectionLink = { to: '/counter/orders', word: 'Orders' };
const customers: SectionLink = { to: '/counter/customers', word: 'Customers' };

/** The places of the counter; how to reach a customer is not for the maker. */
export function CounterNav() {
  const { data: session } = useSuspenseQuery(sessionQuery());
  const forMaker = session.person?.role === 'maker';
  return (
    <SectionNav label="Counter" items={forMaker ? [quotes, orders] : [quotes, orders, customers]} />
  );
}
