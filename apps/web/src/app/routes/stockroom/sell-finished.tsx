import type { FinishedPiece } from '@hidewright/contract';
import { useSuspenseQuery } from '@tanstack/react-query';
import {
  useLoaderData,
  useNavigate,
  useSearchParams,
  type LoaderFunctionArgs,
} from 'react-router-dom';
import { Card } from '../../../components/card.tsx';
import { EmptyState } from '../../../components/empty-state.tsx';
import { LinkButton } from '../../../components/link-button.tsx';
import { PageHeader } from '../../../components/page-header.tsx';
import { RouteError } from '../../../components/route-error.tsx';
import { say } from '../../../components/toast.ts';
import { AddCustomerForm } from '../../../features/customers/components/add-customer-form.tsx';
import { customersQuery } from '../../../features/customers/customers.queries.ts';
import { FinishedFacts } from '../../../features/finished-pieces/components/finished-facts.tsx';
import { SellForm } from '../../../features/finished-pieces/components/sell-form.tsx';
import { finishedPieceQuery } from '../../../features/finished-pieces/finished-pieces.queries.ts';
import { finishedName } from '../../../features/finished-pieces/finished-words.ts';
import { AddTaxRateForm } from '../../../features/tax-rates/components/add-tax-rate-form.tsx';
import { NoTaxAdvice } from '../../../features/tax-rates/components/no-tax-advice.tsx';
import { rateCards, usualRate } from '../../../features/tax-rates/rate-cards.ts';
import { taxRatesQuery } from '../../../features/tax-rates/tax-rates.queries.ts';
import { countText } from '../../../lib/formatting.ts';
import { draftKeyAt } from '../../../lib/draft.ts';
import { queryClient } from '../../../lib/query-client.ts';
import { choicesOf } from './choices.ts';

export async function loader({ params }: LoaderFunctionArgs) {
  const [piece] = await Promise.all([
    queryClient.fetchQuery(finishedPieceQuery(Number(params['id']))),
    queryClient.ensureQueryData(customersQuery()),
    queryClient.ensureQueryData(taxRatesQuery()),
  ]);
  return piece;
}

export function Component() {
  const { id } = useLoaderData<FinishedPiece>();
  const { data: piece } = useSuspenseQuery(finishedPieceQuery(id));
  return (
    <>
      <PageHeader title="Sell from the shelf" subtitle={finishedName(piece)} />
      {piece.onHand === 0 ? <NoneLeft piece={piece} /> : <Sale piece={piece} />}
    </>
  );
}

function Sale({ piece }: { piece: FinishedPiece }) {
  const navigate = useNavigate();
  const [search] = useSearchParams();
  const { data: customers } = useSuspenseQuery(customersQuery());
  const { data: rates } = useSuspenseQuery(taxRatesQuery());
  const choices = choicesOf(customers.items);
  const asked = Number(search.get('customer'));
  return (
    <div className="grid items-start gap-5 lg:grid-cols-2">
      <Card
        title="To whom, and for how much"
        subtitle="They leave the shelf at once; the invoice is a draft until it is issued."
      >
        <SellForm
          piece={piece}
          draftKey={draftKeyAt(`sell-finished-${piece.id}`, search)}
          customers={choices}
          buyer={choices.some(({ value }) => value === asked) ? asked : undefined}
          newCustomer={(onAdded) => <AddCustomerForm brief onAdded={({ id }) => onAdded(id)} />}
          rates={rateCards(rates)}
          newRate={(onAdded) => <AddTaxRateForm onAdded={({ id }) => onAdded(id)} />}
          usualRate={usualRate(rates)}
          actions={<LinkButton to={`/stockroom/finished/${piece.id}`}>Leave it</LinkButton>}
          onSold={async (invoice, quantity) => {
            await navigate(`/books/invoices/${invoice.id}`);
            say(`${countText(quantity)} of ${finishedName(piece)} left the shelf.`);
          }}
        />
      </Card>
      <div className="space-y-5">
        <FinishedFacts piece={piece} />
        <NoTaxAdvice />
      </div>
    </div>
  );
}

function NoneLeft({ piece }: { piece: FinishedPiece }) {
  return (
    <EmptyState
      title="None of them is on the shelf."
      action={<LinkButton to={`/stockroom/finished/${piece.id}`}>Look at what left</LinkButton>}
    >
      They can be sold once there are some: put some on the shelf, or count it.
    </EmptyState>
  );
}

export const ErrorBoundary = RouteError;
