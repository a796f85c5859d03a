import type { InvoiceSummary } from '@hidewright/contract';
import { StateMark } from '../../../components/state-mark.tsx';

/** The invoice's state, and whether its day has passed. */
export function InvoiceStateMark({
  invoice,
}: {
  invoice: Pick<InvoiceSummary, 'state' | 'overdue'>;
}) {
  return (
    <span className="inline-flex flex-wrap gap-1.5">
      <StateMark state={invoice.state} />
      {invoice.overdue && <StateMark state="overdue" />}
    </span>
  );
}
