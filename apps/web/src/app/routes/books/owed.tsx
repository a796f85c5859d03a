import type { AgeBand } from '@hidewright/contract';
import { useSuspenseQuery } from '@tanstack/react-query';
import { Card } from '../../../components/card.tsx';
import { EmptyState } from '../../../components/empty-state.tsx';
import { KeyFigures } from '../../../components/key-figures.tsx';
import { PageHeader } from '../../../components/page-header.tsx';
import { RouteError } from '../../../components/route-error.tsx';
import { OwedTable } from '../../../features/invoices/components/owed-table.tsx';
import { owedQuery } from '../../../features/invoices/invoices.queries.ts';
import { moneyText } from '../../../lib/formatting.ts';
import { queryClient } from '../../../lib/query-client.ts';
import { useWorkshop } from '../../../lib/workshop.tsx';
import { BooksNav } from './books-nav.tsx';

export async function loader() {
  await queryClient.ensureQueryData(owedQuery());
  return null;
}

const bandWords: Record<AgeBand, string> = {
  'not due': 'Not due yet',
  '1 to 30': '1 to 30 days',
  '31 to 60': '31 to 60 days',
  '61 to 90': '61 to 90 days',
  'over 90': 'Over 90 days',
};

const counted = (count: number) => `${count} ${count === 1 ? 'invoice' : 'invoices'}`;

export function Component() {
  const { currency } = useWorkshop();
  const { data: owed } = useSuspenseQuery(owedQuery());
  return (
    <>
      <PageHeader title="Owed" subtitle="What was invoiced and is not paid" />
      <BooksNav />
      {owed.items.length > 0 && (
        <Card
          title={`By age, ${currency}`}
          subtitle="Days after the day it was due"
          className="mb-5"
        >
          <KeyFigures
            figures={[
              ...owed.bands.map(({ band, count, open }) => ({
                word: bandWords[band],
                figure: moneyText(open),
                note: counted(count),
              })),
              { word: 'Together', figure: moneyText(owed.open), note: counted(owed.items.length) },
            ]}
          />
        </Card>
      )}
      <OwedTable
        rows={owed.items}
        empty={
          <EmptyState title="Nobody owes anything.">
            Issued invoices stand here until they are paid.
          </EmptyState>
        }
      />
    </>
  );
}

export const ErrorBoundary = RouteError;
