import type { OwedInvoice } from '@hidewright/contract';
import { useMemo, type ReactNode } from 'react';
import type { Column } from '../../../components/column.ts';
import { DataTable } from '../../../components/data-table.tsx';
import { StateMark } from '../../../components/state-mark.tsx';
import { TextLink } from '../../../components/text-link.tsx';
import { countText, dayText, moneyText } from '../../../lib/formatting.ts';
import { useWorkshop, type Workshop } from '../../../lib/workshop.tsx';
import { sumMoney } from '../../../lib/sum-money.ts';

function columnsFor({ currency, today }: Workshop): Column<OwedInvoice>[] {
  return [
    {
      id: 'invoice',
      header: 'Invoice',
      value: (row) => row.number,
      cell: (row) => <TextLink to={`/books/invoices/${row.invoiceId}`}>{row.number}</TextLink>,
      onPhone: 'title',
    },
    { id: 'customer', header: 'Customer', value: (row) => row.customerName },
    {
      id: 'due',
      header: 'Due',
      value: (row) => row.dueOn,
      cell: (row) => dayText(row.dueOn, today),
    },
    {
      id: 'late',
      header: 'Days late',
      value: (row) => row.daysLate,
      cell: (row) =>
        row.daysLate === 0 ? (
          'not due'
        ) : (
          <StateMark state="overdue">{countText(row.daysLate)}</StateMark>
        ),
      align: 'right',
    },
    {
      id: 'total',
      header: 'Total',
      value: (row) => row.total,
      cell: (row) => moneyText(row.total),
      align: 'right',
      total: (rows) => sumMoney(rows.map((row) => row.total)),
    },
    {
      id: 'open',
      header: `Open, ${currency}`,
      value: (row) => row.open,
      cell: (row) => moneyText(row.open),
      align: 'right',
      total: (rows) => sumMoney(rows.map((row) => row.open)),
    },
  ];
}

export function OwedTable({ rows, empty }: { rows: readonly OwedInvoice[]; empty: ReactNode }) {
  const workshop = useWorkshop();
  const columns = useMemo(() => columnsFor(workshop), [workshop]);
  return (
    <DataTable
      label="What is owed"
      rows={rows}
      rowId={(row) => row.invoiceId}
      columns={columns}
      empty={empty}
      filterLabel="Filter by customer or number"
    />
  );
}
