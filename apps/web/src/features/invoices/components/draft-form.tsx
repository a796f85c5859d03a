import { draftInvoice, type Invoice } from '@hidewright/contract';
import type { ReactNode } from 'react';
import { Form } from '../../../components/form.tsx';
import { RadioCards, type RadioCard } from '../../../components/radio-cards.tsx';
import { useDraftInvoice } from '../invoices.mutations.ts';

interface DraftFormProps {
  orderId: number;
  rates: readonly RadioCard[];
  /** Chosen to begin with; nothing at the first invoice, when it must be said. */
  usual: number | null | undefined;
  actions: ReactNode;
  onDrafted: (invoice: Invoice) => unknown;
}

export function DraftForm({ orderId, rates, usual, actions, onDrafted }: DraftFormProps) {
  const send = useDraftInvoice();
  return (
    <Form
      schema={draftInvoice.body}
      defaults={{ orderId, ...(usual !== undefined && { taxRateId: usual }) }}
      submitWord="Draft the invoice"
      actions={actions}
      onSend={async (body) => onDrafted(await send.mutateAsync({ body }))}
    >
      <RadioCards
        name="taxRateId"
        label="Tax on this invoice"
        help="On a draft it can still be changed, line by line."
        cards={[...rates, { value: null, label: 'No tax applies' }]}
      />
    </Form>
  );
}
