import type { Invoice } from '@hidewright/contract';
import { Card } from '../../../components/card.tsx';
import { Notice } from '../../../components/notice.tsx';
import { TextLink } from '../../../components/text-link.tsx';

/** Whom the paper goes to; on a draft, what the customer's own page says now. */
export function BilledTo({ invoice }: { invoice: Invoice }) {
  const { billedTo, customerId, state } = invoice;
  const customer = <TextLink to={`/counter/customers/${customerId}`}>their page</TextLink>;
  return (
    <Card title="To">
      <p className="font-semibold">{billedTo.name}</p>
      {billedTo.contactName !== '' && <p>{billedTo.contactName}</p>}
      <p className="whitespace-pre-line">{billedTo.address}</p>
      {state === 'draft' && billedTo.address === '' && (
        <Notice tone="attention" className="mt-3">
          Their address is not known. Enter it on {customer} before you issue.
        </Notice>
      )}
      {state !== 'draft' && <p className="mt-2 text-sm text-ink-soft">As it was issued.</p>}
    </Card>
  );
}
