import type { Quote } from '@hidewright/contract';
import { useSuspenseQuery } from '@tanstack/react-query';
import {
  redirect,
  useLoaderData,
  useSearchParams,
  type LoaderFunctionArgs,
} from 'react-router-dom';
import { LinkButton } from '../../../components/link-button.tsx';
import { PageHeader } from '../../../components/page-header.tsx';
import { RouteError } from '../../../components/route-error.tsx';
import { ladderOf, OptionSwitch } from '../../../features/quotes/components/option-switch.tsx';
import { rungAt } from '../../../features/quotes/components/quote-preview.tsx';
import { RungSwitch } from '../../../features/quotes/components/rung-switch.tsx';
import { CostCard } from '../../../features/quotes/components/workings/cost-card.tsx';
import { CutCard } from '../../../features/quotes/components/workings/cut-card.tsx';
import { HoursCard } from '../../../features/quotes/components/workings/hours-card.tsx';
import { LeatherCard } from '../../../features/quotes/components/workings/leather-card.tsx';
import { ReachCard } from '../../../features/quotes/components/workings/reach-card.tsx';
import { ShakeCard } from '../../../features/quotes/components/workings/shake-card.tsx';
import { WhatIfCard } from '../../../features/quotes/components/workings/what-if-card.tsx';
import { quoteQuery } from '../../../features/quotes/quotes.queries.ts';
import { queryClient } from '../../../lib/query-client.ts';

export async function loader({ params }: LoaderFunctionArgs) {
  const quote = await queryClient.ensureQueryData(quoteQuery(Number(params['id'])));
  // Who may not see the numbers has no workings to look at.
  return quote.numbers ? quote : redirect(`/counter/quotes/${quote.id}`);
}

export function Component() {
  const { id } = useLoaderData<Quote>();
  const { data: quote } = useSuspenseQuery(quoteQuery(id));
  const [search, setSearch] = useSearchParams();
  const { numbers, input: whole } = quote;
  if (!numbers || !whole) return null;
  const option = search.get('option') ?? quote.agreedOption;
  const ladder = ladderOf(numbers, option);
  const picked = (Number(search.get('pieces')) || quote.agreedQuantity) ?? undefined;
  const rung = rungAt(ladder.breaks, picked);
  if (!rung) return null;
  const hardware = whole.options?.find(({ name }) => name === option)?.hardware ?? whole.hardware;
  const input = { ...whole, hardware };
  const go = (next: Record<string, string | null>) => {
    const now = { pieces: String(rung.quantity), option, ...next };
    const kept = Object.entries(now).filter(
      (entry): entry is [string, string] => entry[1] !== null,
    );
    setSearch(Object.fromEntries(kept), { replace: true, preventScrollReset: true });
  };
  return (
    <>
      <PageHeader
        title={`Workings of quote ${quote.number}`}
        subtitle={`${quote.title} for ${quote.customerName}`}
        action={
          <LinkButton to={`/counter/quotes/${id}?pieces=${rung.quantity}`}>To the quote</LinkButton>
        }
      />
      <RungSwitch
        quantities={ladder.breaks.map(({ quantity }) => quantity)}
        chosen={rung.quantity}
        onChoose={(quantity) => go({ pieces: String(quantity) })}
      />
      <OptionSwitch
        options={numbers.options}
        chosen={option}
        onChoose={(name) => go({ option: name })}
      />
      <div className="grid items-start gap-5 lg:grid-cols-2">
        <div className="space-y-5">
          <HoursCard input={input} rung={rung} />
          <CostCard rung={rung} />
        </div>
        <div className="space-y-5">
          <CutCard input={input} rung={rung} />
          <LeatherCard input={input} rung={rung} />
          <ReachCard input={input} rung={rung} />
          <ShakeCard input={input} rung={rung} />
          <WhatIfCard key={`${rung.quantity} ${option}`} input={input} rung={rung} />
        </div>
      </div>
    </>
  );
}

export const ErrorBoundary = RouteError;
