import { readSalesSheetFile } from '@hidewright/contract';
import { useSuspenseQuery } from '@tanstack/react-query';
import { Sheet } from 'lucide-react';
import { useLoaderData, useNavigate, type LoaderFunctionArgs } from 'react-router-dom';
import { buttonLook } from '../../../components/button-look.ts';
import { PageHeader } from '../../../components/page-header.tsx';
import { RouteError } from '../../../components/route-error.tsx';
import { LockCard } from '../../../features/periods/components/lock-card.tsx';
import { PeriodPicker } from '../../../features/periods/components/period-picker.tsx';
import { PeriodsTable } from '../../../features/periods/components/periods-table.tsx';
import { SheetInvoices, SheetPayments } from '../../../features/periods/components/sheet-rows.tsx';
import { SheetTotals, TaxByRate } from '../../../features/periods/components/sheet-totals.tsx';
import { monthPresets } from '../../../features/periods/month-presets.ts';
import { periodText } from '../../../features/periods/period-text.ts';
import { periodsQuery, salesSheetQuery } from '../../../features/periods/periods.queries.ts';
import { sessionQuery } from '../../../features/session/session.queries.ts';
import { addressOf } from '../../../lib/api.ts';
import { queryClient } from '../../../lib/query-client.ts';
import { BooksNav } from './books-nav.tsx';

interface Days {
  from: string;
  to: string;
}

export async function loader({ request }: LoaderFunctionArgs): Promise<Days> {
  const days = await readDays(new URL(request.url).searchParams);
  await Promise.all([
    queryClient.fetchQuery(salesSheetQuery(days.from, days.to)),
    queryClient.ensureQueryData(periodsQuery()),
  ]);
  return days;
}

/** This month so far, where the address names no days. */
async function readDays(search: URLSearchParams): Promise<Days> {
  const session = await queryClient.ensureQueryData(sessionQuery());
  const [thisMonth] = monthPresets(
    session.workshop?.today ?? new Date().toISOString().slice(0, 10),
  );
  return {
    from: search.get('from') ?? thisMonth?.from ?? '',
    to: search.get('to') ?? thisMonth?.to ?? '',
  };
}

export function Component() {
  const { from, to } = useLoaderData<Days>();
  const navigate = useNavigate();
  const { data: sheet } = useSuspenseQuery(salesSheetQuery(from, to));
  const { data: periods } = useSuspenseQuery(periodsQuery());
  return (
    <>
      <PageHeader
        title="Sales sheet"
        subtitle={periodText(sheet)}
        action={
          <a
            href={addressOf(readSalesSheetFile, { query: { from, to } })}
            download
            className={buttonLook({ tone: 'primary' })}
          >
            <Sheet size={16} aria-hidden="true" />
            Spreadsheet
          </a>
        }
      />
      <BooksNav />
      <PeriodPicker
        from={from}
        to={to}
        onPick={(days) => void navigate(`?from=${days.from}&to=${days.to}`)}
      />
      <div className="grid items-start gap-5 lg:grid-cols-[minmax(0,1fr)_minmax(0,24rem)]">
        <div className="space-y-5">
          <SheetTotals sheet={sheet} />
          <SheetInvoices sheet={sheet} />
          <SheetPayments sheet={sheet} />
        </div>
        <div className="space-y-5">
          <LockCard key={`${from} ${to}`} sheet={sheet} locks={sheet.locks} />
          <TaxByRate sheet={sheet} />
        </div>
      </div>
      <div className="mt-5">
        <PeriodsTable rows={periods.items} />
      </div>
    </>
  );
}

export const ErrorBoundary = RouteError;
