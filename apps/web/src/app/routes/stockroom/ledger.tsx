import { movementKinds, readMovementsFile } from '@hidewright/contract';
import { useLoaderData, useSearchParams, type LoaderFunctionArgs } from 'react-router-dom';
import { PageHeader } from '../../../components/page-header.tsx';
import { RouteError } from '../../../components/route-error.tsx';
import {
  LedgerFilter,
  type LedgerChoice,
} from '../../../features/stock/components/ledger-filter.tsx';
import { MovementsTable } from '../../../features/stock/components/movements-table.tsx';
import { OnlyOf, type LedgerSubject } from '../../../features/stock/components/only-of.tsx';
import { movementsQuery } from '../../../features/stock/stock.queries.ts';
import { addressOf } from '../../../lib/api.ts';
import { queryClient } from '../../../lib/query-client.ts';
import { useWorkshop } from '../../../lib/workshop.tsx';
import { askedSubject, readSubject } from './ledger-subject.ts';
import { StockroomNav } from './stockroom-nav.tsx';

const wanted = (search: URLSearchParams): LedgerChoice => ({
  kind: movementKinds.find((kind) => kind === search.get('kind')),
  person: search.get('person') ?? undefined,
  from: search.get('from') ?? undefined,
  to: search.get('to') ?? undefined,
});

const named = (choice: LedgerChoice) =>
  Object.entries(choice).filter((entry): entry is [string, string] => entry[1] !== undefined);

export async function loader({ request }: LoaderFunctionArgs) {
  const { searchParams } = new URL(request.url);
  const asked = { ...wanted(searchParams), ...askedSubject(searchParams).asked };
  const [subject] = await Promise.all([
    readSubject(searchParams),
    queryClient.ensureInfiniteQueryData(movementsQuery(asked)),
  ]);
  return subject;
}

export function Component() {
  const subject = useLoaderData<LedgerSubject | null>();
  const [search, setSearch] = useSearchParams();
  const { today } = useWorkshop();
  const chosen = wanted(search);
  const { asked, kept } = askedSubject(search);
  return (
    <>
      <PageHeader title="Ledger" subtitle="Everything that moved, newest first" />
      <StockroomNav />
      {subject !== null && (
        <OnlyOf
          subject={subject}
          without={`/stockroom/ledger?${new URLSearchParams(named(chosen))}`}
        />
      )}
      <LedgerFilter
        key={search.toString()}
        chosen={chosen}
        today={today}
        onChoose={(choice) => setSearch([...kept, ...named(choice)])}
      />
      <MovementsTable
        item={{ ...chosen, ...asked }}
        mixed
        sheetAddress={addressOf(readMovementsFile, { query: { ...chosen, ...asked } })}
      />
    </>
  );
}

export const ErrorBoundary = RouteError;
