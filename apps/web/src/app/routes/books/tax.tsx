import { useSuspenseQuery } from '@tanstack/react-query';
import { Card } from '../../../components/card.tsx';
import { PageHeader } from '../../../components/page-header.tsx';
import { RouteError } from '../../../components/route-error.tsx';
import { say } from '../../../components/toast.ts';
import { AddTaxRateForm } from '../../../features/tax-rates/components/add-tax-rate-form.tsx';
import { NoTaxAdvice } from '../../../features/tax-rates/components/no-tax-advice.tsx';
import { TaxRatesTable } from '../../../features/tax-rates/components/tax-rates-table.tsx';
import { taxRatesQuery } from '../../../features/tax-rates/tax-rates.queries.ts';
import { queryClient } from '../../../lib/query-client.ts';
import { BooksNav } from './books-nav.tsx';

export async function loader() {
  await queryClient.ensureQueryData(taxRatesQuery());
  return null;
}

export function Component() {
  const { data: rates } = useSuspenseQuery(taxRatesQuery());
  return (
    <>
      <PageHeader title="Tax" subtitle="The rates that invoices can bear" />
      <BooksNav />
      <div className="grid items-start gap-5 lg:grid-cols-[minmax(0,1fr)_minmax(0,26rem)]">
        <Card title="Rates">
          <TaxRatesTable
            rows={rates.items}
            empty={
              <p className="text-ink-soft">
                No rates yet. Where no tax applies to what you sell, none is needed.
              </p>
            }
          />
        </Card>
        <div className="space-y-5">
          <NoTaxAdvice />
          <Card title="Enter a rate">
            <AddTaxRateForm again onAdded={(rate) => say(`${rate.name} is entered.`)} />
          </Card>
        </div>
      </div>
    </>
  );
}

export const ErrorBoundary = RouteError;
