import { readQuote, type Quote } from '@hidewright/contract';
import { useQueryClient, useSuspenseQuery } from '@tanstack/react-query';
import { redirect, useLoaderData, useNavigate, type LoaderFunctionArgs } from 'react-router-dom';
import { PageHeader } from '../../../components/page-header.tsx';
import { RouteError } from '../../../components/route-error.tsx';
import { say } from '../../../components/toast.ts';
import { AddCustomerForm } from '../../../features/customers/components/add-customer-form.tsx';
import { customersQuery } from '../../../features/customers/customers.queries.ts';
import { QuoteForm, typedOf } from '../../../features/quotes/components/quote-form.tsx';
import { useChangeQuote } from '../../../features/quotes/quotes.mutations.ts';
import { patternChoicesQuery, quoteQuery } from '../../../features/quotes/quotes.queries.ts';
import { call } from '../../../lib/api.ts';
import { queryClient } from '../../../lib/query-client.ts';
import { customerChoices } from './customer-choices.ts';

export async function loader({ params }: LoaderFunctionArgs) {
  const id = Number(params['id']);
  const [quote] = await Promise.all([
    queryClient.fetchQuery(quoteQuery(id)),
    queryClient.ensureQueryData(customersQuery()),
    queryClient.ensureQueryData(patternChoicesQuery()),
  ]);
  // What was sent never changes.
  return quote.state === 'draft' ? quote : redirect(`/counter/quotes/${id}`);
}

export function Component() {
  const opened = useLoaderData<Quote>();
  const { id, number } = opened;
  const client = useQueryClient();
  const navigate = useNavigate();
  const change = useChangeQuote();
  const { data: customers } = useSuspenseQuery(customersQuery());
  const { data: patterns } = useSuspenseQuery(patternChoicesQuery());
  const { queryKey } = quoteQuery(id);

  async function reload() {
    const now = await call(readQuote, { params: { id } });
    client.setQueryData(queryKey, now);
    return typedOf(now);
  }

  return (
    <>
      <PageHeader
        title={`Change quote ${number}`}
        subtitle="Saving works it out again, with the prices of today."
      />
      <QuoteForm
        key={id}
        defaults={typedOf(opened)}
        customers={customerChoices(customers.items)}
        newCustomer={(onAdded) => (
          <AddCustomerForm brief onAdded={(customer) => onAdded(customer.id)} />
        )}
        patterns={patterns}
        draftKey={`quote-${id}`}
        submitWord="Save the draft"
        cancelTo={`/counter/quotes/${id}`}
        onReload={reload}
        onSend={async (body) => {
          const ifMatch = client.getQueryData<Quote>(queryKey)?.version ?? opened.version;
          client.setQueryData(
            queryKey,
            await change.mutateAsync({ params: { id }, body, ifMatch }),
          );
          say(`Quote ${number} is worked out again.`);
          await navigate(`/counter/quotes/${id}`);
        }}
      />
    </>
  );
}

export const ErrorBoundary = RouteError;
