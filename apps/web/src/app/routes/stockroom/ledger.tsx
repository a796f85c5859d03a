import { movementKinds, readMovementsFile } from '@hidewright/contract';
import { useSearchParams, type LoaderFunctionArgs } from 'react-router-dom';
import { PageHeader } from '../../../components/page-header.tsx';
import { RouteError } from '../../../components/route-error.tsx';
import {
  LedgerFilter,
  type LedgerChoice,
} from '../../../features/stock/components/ledger-filter.tsx';
import { MovementsTable } from '../../../features/stock/components/movements-table.tsx';
import { movementsQuery } from '../../../features/stock/stock.queries.ts';
import { addressOf } from '../../../lib/api.ts';
import { queryClient } from '../../../lib/query-client.ts';
import { useWorkshop } from '../../../lib/workshop.tsx';
import { StockroomNav } from './stockroom-nav.tsx';

const wanted = (search: URLSearchParams): LedgerChoice => ({
  kind: movementKinds.find((kind) => kind === search.get('kind')),
  person: search.get('person') ?? undefined,
  from: search.get('from') ?? undefined,
  to: search.get('to') ?? undefined,
});

export async function loader({ request }: LoaderFunctionArgs) {
  const { searchParams } = new URL(request.url);
  await queryClient.ensureInfiniteQueryData(movementsQuery(wanted(searchParams)));
  return null;
}

export function Component() {
  const [search, setSearch] = useSearchParams();
  const { today } = useWorkshop();
  const chosen = wanted(search);
  const named = (choice: LedgerChoice) =>
    Object.entries(choice).filter((entry): entry is [string, string] => entry[1] !== undefined);
  return (
    <>
      <PageHeader title="Ledger" subtitle="Everything that moved, newest first" />
      <StockroomNav />
      <LedgerFilter
        key={search.toString()}
        chosen={chosen}
        today={today}
        onChoose={(choice) => setSearch(named(choice))}
      />
      <MovementsTable
        item={chosen}
        mixed
        sheetAddress={addressOf(readMovementsFile, { query: chosen })}
      />
    </>
  );
}

export const ErrorBoundary = RouteError;
