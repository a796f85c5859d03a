import { quoteTerms } from '@hidewright/contract';
import { useSuspenseQuery } from '@tanstack/react-query';
import { useNavigate, useSearchParams } from 'react-router-dom';
import { PageHeader } from '../../../components/page-header.tsx';
import { RouteError } from '../../../components/route-error.tsx';
import { say } from '../../../components/toast.ts';
import { AddCustomerForm } from '../../../features/customers/components/add-customer-form.tsx';
import { customersQuery } from '../../../features/customers/customers.queries.ts';
import { ShelfNote } from '../../../features/finished-pieces/components/shelf-note.tsx';
import { QuoteForm, type TypedQuote } from '../../../features/quotes/components/quote-form.tsx';
import { useCreateQuote } from '../../../features/quotes/quotes.mutations.ts';
import { patternChoicesQuery, quoteQuery } from '../../../features/quotes/quotes.queries.ts';
import { draftKeyAt } from '../../../lib/draft.ts';
import { queryClient } from '../../../lib/query-client.ts';
import { customerChoices } from './customer-choices.ts';

export async function loader() {
  await Promise.all([
    queryClient.ensureQueryData(customersQuery()),
    queryClient.ensureQueryData(patternChoicesQuery()),
  ]);
  return null;
}

export function Component() {
  const [search] = useSearchParams();
  const navigate = useNavigate();
  const create = useCreateQuote();
  const { data: customers } = useSuspenseQuery(customersQuery());
  const { data: patterns } = useSuspenseQuery(patternChoicesQuery());
  const customer = customerChoices(customers.items).find(
    ({ value }) => value === Number(search.get('customer')),
  );
  const pattern = patterns.find(({ value }) => value === Number(search.get('pattern')));
  return (
    <>
      <PageHeader title="New quote" />
      <QuoteForm
        defaults={startingWith(
          customer?.value,
          pattern?.value ?? (patterns.length === 1 ? patterns[0]?.value : undefined),
        )}
        customers={customerChoices(customers.items)}
        newCustomer={(onAdded) => <AddCustomerForm brief onAdded={({ id }) => onAdded(id)} />}
        patterns={patterns}
        shelf={(patternId, customerId) => (
          <ShelfNote patternId={patternId} customerId={customerId} />
        )}
        draftKey={draftKeyAt('quote-new', search)}
        submitWord="Save the draft"
        cancelTo="/counter/quotes"
        onSend={async (body) => {
          const quote = await create.mutateAsync({ body });
          queryClient.setQueryData(quoteQuery(quote.id).queryKey, quote);
          say(`Quote ${quote.number} is drafted.`);
          await navigate(`/counter/quotes/${quote.id}`);
        }}
      />
    </>
  );
}

function startingWith(
  customerId: number | undefined,
  patternId: number | undefined,
): Partial<TypedQuote> {
  return {
    ...(customerId !== undefined && { customerId }),
    ...(patternId !== undefined && { patternId }),
    title: '',
    inHandsOn: null,
    breaks: [50, 100, 250].map((quantity) => ({ quantity, typedPrice: null, rule: null })),
    tooling: [],
    message: '',
    terms: quoteTerms.parse({}),
    overrides: {},
  };
}

export const ErrorBoundary = RouteError;
