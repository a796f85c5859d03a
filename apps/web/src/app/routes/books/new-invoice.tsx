import type { OrderToInvoice, TaxRate } from '@hidewright/contract';
import { useSuspenseQuery } from '@tanstack/react-query';
import { useState } from 'react';
import { useNavigate, useSearchParams } from 'react-router-dom';
import { Button } from '../../../components/button.tsx';
import { Card } from '../../../components/card.tsx';
import { Dialog } from '../../../components/dialog.tsx';
import { EmptyState } from '../../../components/empty-state.tsx';
import { KeyFigures } from '../../../components/key-figures.tsx';
import { LinkButton } from '../../../components/link-button.tsx';
import { PageHeader } from '../../../components/page-header.tsx';
import { RouteError } from '../../../components/route-error.tsx';
import { say } from '../../../components/toast.ts';
import { DraftForm } from '../../../features/invoices/components/draft-form.tsx';
import { ordersToInvoiceQuery } from '../../../features/invoices/invoices.queries.ts';
import { AddTaxRateForm } from '../../../features/tax-rates/components/add-tax-rate-form.tsx';
import { NoTaxAdvice } from '../../../features/tax-rates/components/no-tax-advice.tsx';
import { rateCards, usualRate } from '../../../features/tax-rates/rate-cards.ts';
import { taxRatesQuery } from '../../../features/tax-rates/tax-rates.queries.ts';
import { countText, moneyText } from '../../../lib/formatting.ts';
import { queryClient } from '../../../lib/query-client.ts';
import { useWorkshop } from '../../../lib/workshop.tsx';

export async function loader() {
  await Promise.all([
    queryClient.fetchQuery(ordersToInvoiceQuery()),
    queryClient.ensureQueryData(taxRatesQuery()),
  ]);
  return null;
}

export function Component() {
  const [search] = useSearchParams();
  const { data: waiting } = useSuspenseQuery(ordersToInvoiceQuery());
  // Once it is drafted the order waits no longer, but the page stays until it has moved on.
  const [order] = useState(() =>
    waiting.items.find(({ orderId }) => orderId === Number(search.get('order'))),
  );
  if (order === undefined) return <NotWaiting />;
  return (
    <>
      <PageHeader title={`Invoice ${order.orderNumber}`} subtitle={order.customerName} />
      <div className="grid items-start gap-5 lg:grid-cols-2">
        <AskTax order={order} />
        <WhatIsInvoiced order={order} />
      </div>
    </>
  );
}

function AskTax({ order }: { order: OrderToInvoice }) {
  const navigate = useNavigate();
  const { data: rates } = useSuspenseQuery(taxRatesQuery());
  const [added, setAdded] = useState<TaxRate>();
  const [adding, setAdding] = useState(false);
  return (
    <Card title={rates.usual === null ? 'Your first invoice: which tax?' : 'Tax'}>
      <div className="space-y-5">
        <NoTaxAdvice />
        <DraftForm
          key={added?.id}
          orderId={order.orderId}
          rates={rateCards(rates)}
          usual={added?.id ?? usualRate(rates)}
          actions={<Button onClick={() => setAdding(true)}>Enter a tax rate</Button>}
          onDrafted={(invoice) => navigate(`/books/invoices/${invoice.id}`)}
        />
      </div>
      <Dialog open={adding} onOpenChange={setAdding} title="Enter a tax rate">
        <AddTaxRateForm
          onAdded={(rate) => {
            setAdded(rate);
            setAdding(false);
            say(`${rate.name} is entered.`);
          }}
        />
      </Dialog>
    </Card>
  );
}

function WhatIsInvoiced({ order }: { order: OrderToInvoice }) {
  const { currency } = useWorkshop();
  return (
    <Card title="What is invoiced">
      <KeyFigures
        figures={[
          { word: 'For', figure: order.title },
          { word: 'Pieces', figure: countText(order.quantity) },
          {
            word: `Before tax, ${currency}`,
            figure: moneyText(order.total),
            note: 'as agreed, with tooling where it was charged',
          },
        ]}
      />
    </Card>
  );
}

function NotWaiting() {
  return (
    <>
      <PageHeader title="New invoice" />
      <EmptyState
        title="This order does not wait for an invoice."
        action={<LinkButton to="/books/invoices">Go to the invoices</LinkButton>}
      >
        It has one already, or it is not packed yet.
      </EmptyState>
    </>
  );
}

export const ErrorBoundary = RouteError;
