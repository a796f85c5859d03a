import type { Invoice } from '@hidewright/contract';
import { useSuspenseQuery } from '@tanstack/react-query';
import { useState } from 'react';
import { useLoaderData, type LoaderFunctionArgs } from 'react-router-dom';
import { Button } from '../../../components/button.tsx';
import { Card } from '../../../components/card.tsx';
import { LinkButton } from '../../../components/link-button.tsx';
import { RouteError } from '../../../components/route-error.tsx';
import { BilledTo } from '../../../features/invoices/components/billed-to.tsx';
import { ChangeLinesDialog } from '../../../features/invoices/components/change-lines-dialog.tsx';
import { InvoiceActions } from '../../../features/invoices/components/invoice-actions.tsx';
import { InvoiceLines } from '../../../features/invoices/components/invoice-lines.tsx';
import { InvoiceTicket } from '../../../features/invoices/components/invoice-ticket.tsx';
import { PaymentsTable } from '../../../features/invoices/components/payments-table.tsx';
import { invoiceQuery } from '../../../features/invoices/invoices.queries.ts';
import { sessionQuery } from '../../../features/session/session.queries.ts';
import { NoTaxAdvice } from '../../../features/tax-rates/components/no-tax-advice.tsx';
import { taxRatesQuery } from '../../../features/tax-rates/tax-rates.queries.ts';
import { percentText } from '../../../lib/formatting.ts';
import { queryClient } from '../../../lib/query-client.ts';

export async function loader({ params }: LoaderFunctionArgs) {
  const [invoice] = await Promise.all([
    queryClient.fetchQuery(invoiceQuery(Number(params['id']))),
    queryClient.ensureQueryData(taxRatesQuery()),
  ]);
  return invoice;
}

export function Component() {
  const { id } = useLoaderData<Invoice>();
  const { data: invoice } = useSuspenseQuery(invoiceQuery(id));
  const { data: session } = useSuspenseQuery(sessionQuery());
  const isDraft = invoice.state === 'draft';
  const sellsMore = invoice.orderId === null && session.person?.role === 'owner';
  return (
    <div className="space-y-5">
      <InvoiceTicket invoice={invoice} actions={<InvoiceActions invoice={invoice} />} />
      <div className="grid items-start gap-5 xl:grid-cols-[minmax(0,1fr)_minmax(0,22rem)]">
        <div className="space-y-5">
          <InvoiceLines
            invoice={invoice}
            aside={
              isDraft && (
                <div className="flex flex-wrap gap-2">
                  {sellsMore && (
                    <LinkButton to={`/stockroom/finished?for=${invoice.customerId}`}>
                      Add from the shelf
                    </LinkButton>
                  )}
                  <ChangeLines invoice={invoice} />
                </div>
              )
            }
          />
          {!isDraft && (
            <Card title="Payments">
              <PaymentsTable
                rows={invoice.payments}
                ofOneInvoice
                empty={<p className="text-ink-soft">Nothing was received for it yet.</p>}
              />
            </Card>
          )}
        </div>
        <div className="space-y-5">
          <BilledTo invoice={invoice} />
          {isDraft && <NoTaxAdvice />}
        </div>
      </div>
    </div>
  );
}

function ChangeLines({ invoice }: { invoice: Invoice }) {
  const [open, setOpen] = useState(false);
  const { data: rates } = useSuspenseQuery(taxRatesQuery());
  const choices = rates.items
    .filter((rate) => rate.active)
    .map(({ id, name, percent }) => ({ value: id, label: `${name}, ${percentText(percent, 4)}` }));
  return (
    <>
      <Button onClick={() => setOpen(true)}>Change</Button>
      <ChangeLinesDialog
        key={invoice.version}
        invoice={invoice}
        rates={choices}
        open={open}
        onOpenChange={setOpen}
      />
    </>
  );
}

export const ErrorBoundary = RouteError;
