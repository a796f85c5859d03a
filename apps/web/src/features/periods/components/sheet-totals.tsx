import type { SalesSheet } from '@hidewright/contract';
import { Card } from '../../../components/card.tsx';
import type { Column } from '../../../components/column.ts';
import { DataTable } from '../../../components/data-table.tsx';
import { KeyFigures } from '../../../components/key-figures.tsx';
import { countText, moneyText, percentText } from '../../../lib/formatting.ts';

type TaxRow = SalesSheet['totals']['taxes'][number];

const counted = (count: number, one: string, many: string) =>
  `${countText(count)} ${count === 1 ? one : many}`;

export function SheetTotals({ sheet }: { sheet: SalesSheet }) {
  const { totals, currency } = sheet;
  return (
    <Card title={`Totals, ${currency}`}>
      <KeyFigures
        large
        figures={[
          { word: 'Net', figure: moneyText(totals.net) },
          { word: 'Tax', figure: moneyText(totals.tax) },
          {
            word: 'Total',
            figure: moneyText(totals.total),
            note: counted(totals.invoices, 'invoice', 'invoices'),
          },
          {
            word: 'Received',
            figure: moneyText(totals.received),
            note: counted(totals.payments, 'payment', 'payments'),
          },
        ]}
      />
    </Card>
  );
}

const columns: Column<TaxRow>[] = [
  {
    id: 'rate',
    header: 'Rate',
    value: (row) => row.percent ?? 'No tax',
    cell: (row) => (row.percent === null ? 'No tax' : percentText(row.percent, 4)),
    onPhone: 'title',
    sortable: false,
  },
  {
    id: 'net',
    header: 'Net',
    value: (row) => row.net,
    cell: (row) => moneyText(row.net),
    align: 'right',
    sortable: false,
  },
  {
    id: 'tax',
    header: 'Tax',
    value: (row) => row.tax,
    cell: (row) => moneyText(row.tax),
    align: 'right',
    sortable: false,
  },
];

export function TaxByRate({ sheet }: { sheet: SalesSheet }) {
  return (
    <Card title="Tax by rate">
      <DataTable
        label="Tax by rate"
        rows={sheet.totals.taxes}
        rowId={(row) => row.percent ?? 'none'}
        columns={columns}
        empty={<p className="text-ink-soft">Nothing was issued on these days.</p>}
      />
    </Card>
  );
}
