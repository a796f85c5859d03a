import type { Quote } from '@hidewright/contract';
import { useSuspenseQuery } from '@tanstack/react-query';
import { useState } from 'react';
import { useLoaderData, useSearchParams, type LoaderFunctionArgs } from 'react-router-dom';
import { PageTitle } from '../../../components/page-title.tsx';
import { RouteError } from '../../../components/route-error.tsx';
import { Stitch } from '../../../components/stitch.tsx';
import { TextLink } from '../../../components/text-link.tsx';
import { CanWeMakeIt } from '../../../features/checks/components/can-we-make-it.tsx';
import { CustomerAnswer } from '../../../features/quotes/components/customer-answer.tsx';
import { LayoutCard } from '../../../features/quotes/components/layout-card.tsx';
import { OnePieceCard } from '../../../features/quotes/components/one-piece-card.tsx';
import { ladderOf, OptionSwitch } from '../../../features/quotes/components/option-switch.tsx';
import { OtherRevisions } from '../../../features/quotes/components/other-revisions.tsx';
import { PriceBreaksCard } from '../../../features/quotes/components/price-breaks-card.tsx';
import { QuantitiesCard } from '../../../features/quotes/components/quantities-card.tsx';
import { QuoteActions } from '../../../features/quotes/components/quote-actions.tsx';
import { rungAt } from '../../../features/quotes/components/quote-preview.tsx';
import { QuoteTicket } from '../../../features/quotes/components/quote-ticket.tsx';
import { quoteQuery } from '../../../features/quotes/quotes.queries.ts';
import { sessionQuery } from '../../../features/session/session.queries.ts';
import { ToolingThere } from '../../../features/tools/components/tooling-there.tsx';
import { queryClient } from '../../../lib/query-client.ts';
import { AcceptRun } from './accept-run.tsx';

export async function loader({ params }: LoaderFunctionArgs) {
  return queryClient.ensureQueryData(quoteQuery(Number(params['id'])));
}

export function Component() {
  const { id } = useLoaderData<Quote>();
  const { data: quote } = useSuspenseQuery(quoteQuery(id));
  const { data: session } = useSuspenseQuery(sessionQuery());
  const [quantity, choose] = useQuantity(quote);
  const [picked, pickOption] = useState<string | null>(null);
  const option = quote.state === 'agreed' ? quote.agreedOption : picked;
  const isOwner = session.person?.role === 'owner';
  const isMaker = session.person?.role === 'maker';
  const ladder = quote.numbers && ladderOf(quote.numbers, option);
  const rung = ladder?.breaks.find((each) => each.quantity === quantity);
  return (
    <>
      <PageTitle>{`Quote ${quote.number}`}</PageTitle>
      <QuoteTicket
        quote={quote}
        actions={!isMaker && <QuoteActions quote={quote} isOwner={isOwner} />}
      />
      <Stitch className="my-5" />
      {isOwner && quote.state === 'agreed' && (
        <AcceptRun quote={quote} quantity={quantity} option={option} className="mb-5" />
      )}
      <div className="grid items-start gap-5 lg:grid-cols-2 xl:grid-cols-[minmax(0,25.5rem)_minmax(0,1fr)_minmax(0,20rem)]">
        <LayoutCard
          layout={quote.layout}
          outlinePath={quote.outlinePath}
          patternName={quote.patternName}
          rung={rung}
        />
        <div className="space-y-5">
          {quote.numbers && quote.state !== 'agreed' && (
            <OptionSwitch options={quote.numbers.options} chosen={option} onChoose={pickOption} />
          )}
          {ladder && quote.input ? (
            <PriceBreaksCard
              numbers={ladder}
              target={quote.input.targetPerHour}
              chosen={quantity}
              onChoose={choose}
            />
          ) : (
            <QuantitiesCard quote={quote} chosen={quantity} onChoose={choose} />
          )}
          {rung && quote.input && <OnePieceCard rung={rung} tooling={quote.input.tooling} />}
          {rung && (
            <p>
              <TextLink to={`/counter/quotes/${quote.id}/workings?${workingsOf(quantity, option)}`}>
                All workings: hours, costs, what to cut, what if
              </TextLink>
            </p>
          )}
          {isOwner && rung && ['draft', 'sent'].includes(quote.state) && (
            <ToolingThere
              patternId={quote.patternId}
              customerId={quote.customerId}
              pieces={rung.cutCount}
            />
          )}
        </div>
        <div className="space-y-5 lg:col-span-2 xl:col-span-1">
          <CustomerAnswer quote={quote} quantity={quantity} option={option} isOwner={isOwner} />
          {isOwner && quote.state !== 'agreed' && (
            <AcceptRun quote={quote} quantity={quantity} option={option} />
          )}
          {isMaker && (
            <CanWeMakeIt quoteId={quote.id} quantity={quantity} by={quote.inHandsOn ?? undefined} />
          )}
          <OtherRevisions quote={quote} />
        </div>
      </div>
    </>
  );
}

const workingsOf = (quantity: number, option: string | null) =>
  new URLSearchParams({
    pieces: String(quantity),
    ...(option !== null && { option }),
  }).toString();

/** The quantity that the page is about: the one agreed to, the one picked on the ladder, or the second. */
function useQuantity(quote: Quote): [number, (quantity: number) => void] {
  const [search, setSearch] = useSearchParams();
  const picked = quote.agreedQuantity ?? (Number(search.get('pieces')) || undefined);
  const quantity = rungAt(quote.breaks, picked)?.quantity ?? 0;
  const choose = (next: number) =>
    setSearch({ pieces: String(next) }, { replace: true, preventScrollReset: true });
  return [quantity, choose];
}

export const ErrorBoundary = RouteError;
