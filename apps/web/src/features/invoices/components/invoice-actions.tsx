import { readInvoicePaper, type Invoice } from '@hidewright/contract';
import { Download } from 'lucide-react';
import { useState } from 'react';
import { Button } from '../../../components/button.tsx';
import { buttonLook } from '../../../components/button-look.ts';
import { addressOf } from '../../../lib/api.ts';
import { DiscardDialog } from './discard-dialog.tsx';
import { IssueDialog } from './issue-dialog.tsx';
import { PaymentDialog } from './payment-dialog.tsx';

/** What the invoice's state allows now. */
export function InvoiceActions({ invoice }: { invoice: Invoice }) {
  const [asking, setAsking] = useState<'issue' | 'discard' | 'payment'>();
  const close = () => setAsking(undefined);
  if (invoice.state === 'draft') {
    return (
      <>
        <Button onClick={() => setAsking('discard')}>Discard</Button>
        <Button tone="primary" onClick={() => setAsking('issue')}>
          Issue
        </Button>
        <IssueDialog invoice={invoice} open={asking === 'issue'} onOpenChange={close} />
        <DiscardDialog invoice={invoice} open={asking === 'discard'} onOpenChange={close} />
      </>
    );
  }
  return (
    <>
      <a
        href={addressOf(readInvoicePaper, { params: { id: invoice.id } })}
        download
        className={buttonLook({})}
      >
        <Download size={16} aria-hidden="true" />
        PDF
      </a>
      {(invoice.state === 'issued' || invoice.state === 'part paid') && (
        <Button tone="primary" onClick={() => setAsking('payment')}>
          Record a payment
        </Button>
      )}
      <PaymentDialog invoice={invoice} open={asking === 'payment'} onOpenChange={close} />
    </>
  );
}
